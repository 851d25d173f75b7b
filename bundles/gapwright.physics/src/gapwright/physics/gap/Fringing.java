package gapwright.physics.gap;

import java.util.Locale;

import gapwright.physics.gap.GapGeometry.Place;
import gapwright.physics.material.BhCurve;

/**
 * How the field beside a gap is reckoned. A method gives the fringing factor F ≥ 1, so that a gap of n pieces of length
 * g between poles of gross area A has the reluctance n·g/(µ₀·A·F).
 */
public enum Fringing {

	/** F = 1: a lower bound of the inductance. Source: definition, P = µ₀A/g. */
	NONE {
		@Override
		public FringingFactor factor(GapGeometry gap) {
			return new FringingFactor(1, 0, 0, 0, 0, 0);
		}

		@Override
		public Judgement judge(GapGeometry gap) {
			double ratio = gap.length() / gap.section().leastSide();
			return ratio <= NONE_UP_TO ? Judgement.VALID
					: Judgement.doubtful(ofLeastSide(ratio) + "; without fringing the inductance reads low by about twice that",
							"CONFORMAL comes closest.");
		}
	},

	/**
	 * Each side of the section is widened by the length of the gap: a·b → (a + g)(b + g), d → d + g. Still reads low.
	 * Source: textbook rule (common practice).
	 */
	WIDENED {
		@Override
		public FringingFactor factor(GapGeometry gap) {
			double g = gap.length();
			if (gap.section() instanceof Section.Rectangular rectangle) {
				double a = rectangle.a();
				double b = rectangle.b();
				double fa = 1 + g / a;
				double fb = 1 + g / b;
				return new FringingFactor(fa * fb, -g / (a * a) * fb, -g / (b * b) * fa, fb / a + fa / b, 0, 0);
			}
			double d = gap.section().leastSide();
			double f = 1 + g / d;
			return new FringingFactor(f * f, -2 * f * g / (d * d), 0, 2 * f / d, 0, 0);
		}

		@Override
		public Judgement judge(GapGeometry gap) {
			double ratio = gap.length() / gap.section().leastSide();
			if (ratio > 1) {
				return Judgement.refused("the gap is longer than the least side of the section", SPLIT);
			}
			return ratio <= WIDENED_UP_TO ? Judgement.VALID
					: Judgement.doubtful(ofLeastSide(ratio) + ", the rule is in use up to 10 %; it reads the inductance low there",
							"CONFORMAL comes closer, or split the gap in pieces.");
		}
	},

	/**
	 * F = 1 + (g/√A)·ln(2G/g), G the height of the window. Made for one gap half way along a wound leg.
	 * Source: McLyman, Transformer and Inductor Design Handbook; from memory.
	 */
	LOGARITHMIC {
		@Override
		public FringingFactor factor(GapGeometry gap) {
			double g = gap.length();
			double root = Math.sqrt(gap.section().area());
			double height = gap.windowHeight();
			double log = Math.log(2 * height / g);
			double field = g / root * log;
			boolean rectangular = gap.section() instanceof Section.Rectangular;
			double byHeight = g / root / height;
			// √A goes with a and b each to the power ½, with d to the power 1
			double byA = rectangular ? -0.5 * field / ((Section.Rectangular) gap.section()).a() : -field / gap.section().leastSide();
			double byB = rectangular ? -0.5 * field / ((Section.Rectangular) gap.section()).b() : 0;
			return new FringingFactor(1 + field, byA, byB, (log - 1) / root, byHeight, byHeight);
		}

		@Override
		public Judgement judge(GapGeometry gap) {
			double g = gap.length();
			double height = gap.windowHeight();
			double ratio = g / Math.sqrt(gap.section().area());
			if (!(g < 2 * height)) {
				return Judgement.refused("the gap is not shorter than twice the window's height of " + millimetres(height), SPLIT);
			}
			if (g >= height || ratio > LOGARITHMIC_UP_TO) {
				return Judgement.doubtful(g >= height ? "the gap is longer than the window is high"
						: String.format(Locale.ROOT, "the gap is %.2g of the root of the section, the formula is in use up to 0.25", ratio),
						"CONFORMAL comes closer, or split the gap in pieces.");
			}
			if (gap.pieces() > 1) {
				return Judgement.doubtful("it is made for a single gap and reads the inductance of several pieces high",
						"CONFORMAL knows of pieces.");
			}
			return gap.place() == Place.WITHIN_LEG ? Judgement.VALID
					: Judgement.doubtful("it is made for a gap within a leg", "CONFORMAL knows of other places.");
		}
	},

	/** By conformal mapping, composed from the sides of the section; see {@link Conformal} for formula and source. */
	CONFORMAL {
		@Override
		public FringingFactor factor(GapGeometry gap) {
			return new Conformal(gap).factor();
		}

		@Override
		public Judgement judge(GapGeometry gap) {
			double least = Math.min(gap.firstPole(), gap.secondPole());
			if (!(least > 0)) {
				return Judgement.refused("the gap reaches to the end of the window, so one pole has no side to fringe from",
						"Move the gap, or say that it lies against the yoke.");
			}
			if (gap.place() == Place.AGAINST_YOKE && gap.pieces() > 1) {
				return Judgement.refused("only one piece of a gap can lie against a yoke", "Draw the other pieces as a gap of its own.");
			}
			if (!(new Conformal(gap).bracket() > 0)) {
				return Judgement.refused("the poles are only " + millimetres(least) + " high beside a gap of "
						+ millimetres(gap.length()), SPLIT);
			}
			if (least < gap.length()) {
				return Judgement.doubtful("a pole is " + millimetres(least)
						+ " high, less than the gap is long; the side field reads low", SPLIT);
			}
			double ratio = gap.length() / gap.section().leastSide();
			return ratio <= 1 ? Judgement.VALID
					: Judgement.doubtful("the gap is longer than the least side of the section", SPLIT);
		}
	};

	/** Gap over least side above which the field left out by {@link #NONE} is more than a few per cent. */
	public static final double NONE_UP_TO = 0.02;
	/** Gap over least side up to which {@link #WIDENED} is in use (common practice). */
	public static final double WIDENED_UP_TO = 0.1;
	/** Gap over root of the section up to which {@link #LOGARITHMIC} is in use. */
	public static final double LOGARITHMIC_UP_TO = 0.25;

	private static final String SPLIT = "Split the gap in pieces.";

	/**
	 * @param gap its distances to the window's ends must be known where {@link #needsWindow} says so
	 * @return F with its derivatives; meaningless where {@link #judge} refuses
	 */
	public abstract FringingFactor factor(GapGeometry gap);

	/** @return whether {@link #factor} holds for such a gap */
	public abstract Judgement judge(GapGeometry gap);

	/** @return whether the factor depends on the window round the gap */
	public boolean needsWindow() {
		return this == LOGARITHMIC || this == CONFORMAL;
	}

	/** @return permeance of all pieces together, H */
	public double permeance(GapGeometry gap) {
		return BhCurve.MU_0 * gap.section().area() * factor(gap).value() / (gap.pieces() * gap.length());
	}

	private static String ofLeastSide(double ratio) {
		return String.format(Locale.ROOT, "the gap is %.2g %% of the least side of the section", ratio * 100);
	}

	private static String millimetres(double metres) {
		return String.format(Locale.ROOT, "%.3g mm", metres * 1e3);
	}
}
