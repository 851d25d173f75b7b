package gapwright.study.provenance;

/** Every figure a result holds, by kind: all legs' fluxes come the same way. */
public enum FigureGroup {
	ENERGY("energy", "Energy", "W = Σ i·λ − W′", "Definition of the co-energy; elementary",
			"Without magnets only; no hysteresis."),
	CO_ENERGY("coEnergy", "Co-energy", "W′ = Σ legs A·l·∫₀ᴴ B dH + ½R·φ² + Σ air paths ½P·u²", "Definition; elementary",
			"Without magnets only, where its zero would be a convention; no hysteresis."),
	FLUX_RESIDUAL("fluxResidual", "Flux residual", "Largest |Σ flux| at a joint over the largest flux", "Gauss's law of magnetism",
			"A measure of the solver's rounding; a point that does not converge has no numbers."),

	LEG_FLUX("legs.flux", "Flux Φ", "Balance of flux at every joint, with H·l + R·φ = Σ ±N·i + magnet + potential difference in every leg",
			"Ampère's and Gauss's laws for magnetostatics; solved by damped Newton steps on the convex co-energy",
			"At the mean current; positive from the leg's start to its end. A network: flux runs along the legs and air paths drawn, nowhere else. Expect some per cent."),
	LEG_FLUX_DENSITY("legs.fluxDensity", "Flux density B", "B = Φ/(gross area × stacking factor)", "Definition", "In the iron, even over the section; corners crowd more."),
	LEG_FIELD_STRENGTH("legs.fieldStrength", "Field strength H", "H of B by the material's curve at the operating point's temperature",
			"The material's data", "No hysteresis, even over the section."),
	LEG_MMF_DROP("legs.mmfDrop", "MMF drop", "H × iron path length", "Ampère's law", "The iron alone, without gaps and magnet."),
	LEG_PEAK("legs.peakFluxDensity", "Peak flux density", "The larger |B| of both ends of the ripple or of the linkage swing",
			"Two more solves", "All windings at their highest, or all at their lowest, together."),
	LEG_SATURATION("legs.saturation", "Saturation used", "The material's saturation at the operating point's temperature, between two points on a straight line",
			"The material's data; its definition stands in the material's source", "Outside the temperatures given the end value, with a note."),
	LEG_UTILISATION("legs.utilisation", "Of saturation", "Peak flux density over the saturation used", "Definition",
			"Near from the design's limit on, over from 100 %."),

	GAP_PERMEANCE("gaps.permeance", "Permeance", "P = µ₀·A·F/(n·g): gross area, fringing factor, pieces, length of each", "Definition of permeance",
			"As far as the fringing factor holds."),
	GAP_FRINGING_NONE("gaps.fringingFactor.NONE", "Fringing factor", "F = 1", "Definition, P = µ₀A/g",
			"A lower bound; reads low by more than a few per cent above 2 % of the least side."),
	GAP_FRINGING_WIDENED("gaps.fringingFactor.WIDENED", "Fringing factor", "F = (a + g)(b + g)/(ab), round ((d + g)/d)²", "Textbook rule (common practice)",
			"Gaps up to 10 % of the least side; reads low."),
	GAP_FRINGING_LOGARITHMIC("gaps.fringingFactor.LOGARITHMIC", "Fringing factor", "F = 1 + (g/√A)·ln(2G/g), G the height of the window",
			"McLyman, Transformer and Inductor Design Handbook (from memory)", "One gap within a leg, shorter than the window is high and up to a quarter of √A."),
	GAP_FRINGING_CONFORMAL("gaps.fringingFactor.CONFORMAL", "Fringing factor",
			"F = f(a)·f(b), f(w) = 1 + (c·g/(πw))·[1 + ln(πh/(c·g))]; c = 2 between poles, 4 against a yoke",
			"Balakrishnan, Joines, Wilson, IEEE Trans. Power Electronics 1997; Mühlethaler, Kolar, Ecklebe, ICPE 2011 (from memory; re-derived)",
			"Poles higher than the gap is long, gap shorter than the least side. The guide's page on gaps shows the deviation from field solutions."),
	GAP_MMF_DROP("gaps.mmfDrop", "MMF drop", "Flux of the leg over the gap's permeance", "Definition of permeance", "All pieces together."),

	AIR_PATH_FLUX("airPaths.flux", "Flux Φ", "Φ = P × the MMF between its joints; P as given, or µ₀·A/l", "Definition of permeance",
			"Positive from start to end. As good as the permeance drawn."),

	WINDING_CURRENT("windings.current", "Current", "Imposed by the drive; with a voltage its bias", "The operating point", "Mean."),
	WINDING_SWING("windings.lowestCurrent", "Current swing", "Mean ± half the ripple; with a voltage, the currents at λ ± half of the swing ∫v dt",
			"Faraday's law; solved with the linkage imposed", "Resistance left out: right while R·i is small beside the voltage."),
	WINDING_LINKAGE("windings.linkage", "Linkage", "λ = Σ ±N·φ over its coils", "Definition", "Flux beside the drawn network links nothing here."),
	WINDING_APPARENT("windings.apparentInductance", "Apparent inductance", "L = λ/i", "Definition",
			"Only where this winding alone carries current and no magnet acts."),
	WINDING_FACTOR("windings.inductanceFactor", "A_L", "A_L = L/N² with the differential inductance", "IEC 62044 (term; from memory)", "About the operating point."),

	INDUCTANCE_DIFFERENTIAL("inductance.differential", "Differential inductance", "L = ∂λ/∂i = Nᵀ·G·W from the solved network's own factors",
			"Derivative of the network's equations, exact", "What a small ripple sees, but for hysteresis: in iron without a gap real material gives less."),
	INDUCTANCE_COUPLING("inductance.coupling", "Coupling", "k = L₁₂/√(L₁₁·L₂₂)", "Definition",
			"Leakage is only what the network draws as air paths, or a leakage states."),
	INDUCTANCE_LEAKAGE("inductance.leakage", "Leakage referred", "L₁₁·(1 − k²), the other winding short-circuited", "Elementary",
			"Loses digits as k comes to 1; of what the network draws."),

	LEAKAGE_INDUCTANCE("leakages.inductance", "Leakage inductance", "L = µ₀N²(ℓ/h)·(Σ builds/3 + Σ insulations)·K_R/M²",
			"Energy method, elementary", "Referred to the first winding's turns. Balanced ampere-turns spread evenly; windings longer along their interface than they are thick."),
	LEAKAGE_ROGOWSKI("leakages.rogowskiFactor", "Rogowski factor K_R", "K_R = 1 − (1 − e^(−πh/σ))·σ/(πh)", "Rogowski 1909 (from memory)",
			"Some per cent inside an iron window; 4 to 14 % high for the part of the turns outside it."),
	LEAKAGE_SHORT_CIRCUIT("leakages.shortCircuitInductance", "Short-circuit inductance", "Leakage inductance + L₁₁·(1 − k²) of the drawn network", "Elementary",
			"Counts twice what is drawn as air paths between the same windings as well."),
	LEAKAGE_COUPLING("leakages.coupling", "Coupling k", "Mutual over the root of both own inductances, with all leakage on the first winding's side", "Definition", "As the leakage inductance."),

	CONNECTION_INDUCTANCE("connections.inductance", "Inductance together", "In series sᵀ·L·s, in parallel 1/(sᵀ·L⁻¹·s), s the senses", "Circuit theory, elementary",
			"For small changes about the operating point."),

	SENSITIVITY("sensitivity", "Sensitivity", "dy/dp by the adjoint of the solved network: one factorisation for all", "Implicit function theorem; exact",
			"At this point; at a knot of a table the second derivative is one-sided."),
	TOLERANCE("tolerances", "Tolerance band", "First order Σ|dy/dp|·δ; corners; Monte Carlo with its standard error", "Elementary statistics",
			"Corners are the extremes only where the figure rises or falls throughout; normal samples are cut off at ±δ = 3σ.");

	private final String key;
	private final String title;
	private final Origin origin;

	FigureGroup(String key, String title, String formula, String source, String validity) {
		this.key = key;
		this.title = title;
		origin = new Origin(formula, source, validity);
	}

	/** @return where it stands in the JSON of a check: "legs.flux"; with the method behind it where there are several */
	public String key() {
		return key;
	}

	/** @return what people call it: "Flux density B" */
	public String title() {
		return title;
	}

	Origin origin() {
		return origin;
	}
}
