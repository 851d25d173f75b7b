package gapwright.model.check;

/** Everything that can be wrong or doubtful with a design as drawn; the user guide has a row for each. */
public enum ProblemCode {
	OPERATING_POINT_MISSING("operating-point-missing", Severity.NOTE),
	VALUE_MISSING("value-missing", Severity.ERROR),
	VALUE_OUT_OF_DOMAIN("value-out-of-domain", Severity.ERROR),
	VALUE_IMPLAUSIBLE("value-implausible", Severity.WARNING),
	ID_TWICE("id-twice", Severity.ERROR),
	SATURATION_MISSING("saturation-missing", Severity.WARNING),
	TABLE_NOT_RISING("table-not-rising", Severity.ERROR),
	TABLE_SLOPE_BELOW_AIR("table-slope-below-air", Severity.WARNING),
	SATURATION_TEMPERATURE_TWICE("saturation-temperature-twice", Severity.ERROR),
	SATURATION_RISES("saturation-rises", Severity.WARNING),
	MATERIAL_MISSING("material-missing", Severity.ERROR),
	GAP_ZERO("gap-zero", Severity.NOTE),
	GAP_LONGER_THAN_LEG("gap-longer-than-leg", Severity.ERROR),
	LEG_WITHOUT_LENGTH("leg-without-length", Severity.ERROR),
	SAME_JOINT_TWICE("same-joint-twice", Severity.ERROR),
	AIR_PATH_INCOMPLETE("air-path-incomplete", Severity.ERROR),
	AIR_PATH_TWICE("air-path-twice", Severity.ERROR),
	WINDING_WITHOUT_COIL("winding-without-coil", Severity.ERROR),
	DRIVE_WITHOUT_WINDING("drive-without-winding", Severity.ERROR),
	DRIVE_TWICE("drive-twice", Severity.ERROR),
	OPERATING_POINT_WITHOUT_DRIVE("operating-point-without-drive", Severity.NOTE),
	REFERENCE_OUTSIDE("reference-outside", Severity.ERROR),
	ON_TIME_LONGER_THAN_PERIOD("on-time-longer-than-period", Severity.ERROR),
	LOSS_RANGE_EMPTY("loss-range-empty", Severity.ERROR),
	TABLE_SLOPE_IMPLAUSIBLE("table-slope-implausible", Severity.WARNING),
	GAP_LONGER_THAN_DRAWN("gap-longer-than-drawn", Severity.NOTE),
	WINDING_TWICE("winding-twice", Severity.ERROR),
	CONNECTION_INCOMPLETE("connection-incomplete", Severity.ERROR),
	TOLERANCE_WITHOUT_TARGET("tolerance-without-target", Severity.ERROR),
	TOLERANCE_UNFIT("tolerance-unfit", Severity.ERROR),
	TOLERANCE_TWICE("tolerance-twice", Severity.ERROR),
	TOLERANCE_REACHES_OUTSIDE("tolerance-reaches-outside", Severity.ERROR),
	PERMEABILITY_TEMPERATURE_TWICE("permeability-temperature-twice", Severity.ERROR),
	CURVE_TEMPERATURE_TWICE("curve-temperature-twice", Severity.ERROR);

	private final String code;
	private final Severity severity;

	ProblemCode(String code, Severity severity) {
		this.code = code;
		this.severity = severity;
	}

	/** @return stable name, for example "gap-longer-than-leg" */
	public String code() {
		return code;
	}

	public Severity severity() {
		return severity;
	}
}
