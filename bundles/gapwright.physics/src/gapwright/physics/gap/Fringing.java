package gapwright.physics.gap;

import gapwright.physics.material.BhCurve;

/**
 * How the field beside a gap is reckoned. A method gives the fringing factor F ≥ 1, so that a gap of n pieces of length
 * g between poles of gross area A has the reluctance n·g/(µ₀·A·F).
 */
public enum Fringing {

	/** F = 1: a lower bound of the inductance. Source: definition, P = µ₀A/g. */
	NONE {
		@Override
		public double factor(Section section, double length) {
			Positive.check("length", length);
			return 1;
		}

		@Override
		public Validity validity(Section section, double length) {
			return length <= NONE_UP_TO * section.leastSide() ? Validity.VALID : Validity.DOUBTFUL;
		}
	},

	/**
	 * Each side of the section is widened by the length of the gap: a·b → (a + g)(b + g), d → d + g. Still reads low.
	 * Source: textbook rule (common practice).
	 */
	WIDENED {
		@Override
		public double factor(Section section, double length) {
			Positive.check("length", length);
			if (section instanceof Section.Rectangular rectangle) {
				return (1 + length / rectangle.a()) * (1 + length / rectangle.b());
			}
			double ratio = 1 + length / section.leastSide();
			return ratio * ratio;
		}

		@Override
		public Validity validity(Section section, double length) {
			double ratio = length / section.leastSide();
			return ratio <= WIDENED_UP_TO ? Validity.VALID : ratio <= 1 ? Validity.DOUBTFUL : Validity.REFUSED;
		}
	};

	/** Whether a factor may be used. */
	public enum Validity {
		VALID,
		/** Outside the range the formula is known to hold in; still a number. */
		DOUBTFUL,
		/** The formula makes no sense there: no number. */
		REFUSED
	}

	/** Gap over least side above which the field left out by {@link #NONE} is more than a few per cent. */
	public static final double NONE_UP_TO = 0.02;
	/** Gap over least side up to which {@link #WIDENED} is in use (common practice). */
	public static final double WIDENED_UP_TO = 0.1;

	/**
	 * @param section gross section of the poles
	 * @param length  of one piece, m, &gt; 0
	 * @return F, a ratio ≥ 1
	 * @throws IllegalArgumentException when the length is not above 0
	 */
	public abstract double factor(Section section, double length);

	/** @return whether {@link #factor} holds for such a gap */
	public abstract Validity validity(Section section, double length);

	/**
	 * @param section gross section of the poles
	 * @param length  of each piece, m, &gt; 0
	 * @param pieces  ≥ 1, in series, each with its own fringing field
	 * @return permeance of all pieces together, H
	 */
	public double permeance(Section section, double length, int pieces) {
		if (pieces < 1) {
			throw new IllegalArgumentException("pieces = " + pieces + ": must be 1 or more");
		}
		return BhCurve.MU_0 * section.area() * factor(section, length) / (pieces * length);
	}
}
