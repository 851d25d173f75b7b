package gapwright.ui.pages;

import gapwright.model.CurrentDrive;
import gapwright.model.Drive;
import gapwright.model.OperatingPoint;
import gapwright.model.Winding;
import gapwright.model.edit.OperatingPointEdits;
import gapwright.model.edit.history.Edit;

/** How a winding can be connected at an operating point. */
enum DriveKind {
	OPEN("Not driven"), CURRENT("Current"), VOLTAGE("Voltage");

	private final String label;

	DriveKind(String label) {
		this.label = label;
	}

	String label() {
		return label;
	}

	/** @param drive null where the winding is not driven */
	static DriveKind of(Drive drive) {
		return drive == null ? OPEN : drive instanceof CurrentDrive ? CURRENT : VOLTAGE;
	}

	Edit connect(OperatingPoint point, Winding winding) {
		return switch (this) {
		case OPEN -> OperatingPointEdits.disconnect(point, winding);
		case CURRENT -> OperatingPointEdits.driveByCurrent(point, winding);
		case VOLTAGE -> OperatingPointEdits.driveByVoltage(point, winding);
		};
	}
}
