package gapwright.model.edit;

import java.util.Set;
import java.util.function.Supplier;

import org.eclipse.emf.ecore.util.EcoreUtil;

import gapwright.model.CurrentDrive;
import gapwright.model.Design;
import gapwright.model.Drive;
import gapwright.model.GapwrightFactory;
import gapwright.model.Ids;
import gapwright.model.OperatingPoint;
import gapwright.model.VoltageDrive;
import gapwright.model.Winding;
import gapwright.model.edit.history.Edit;
import gapwright.model.quantity.Dimension;
import gapwright.model.quantity.Quantity;

/** Edits of operating points and drives. */
public final class OperatingPointEdits {

	private OperatingPointEdits() {
	}

	/** Adds an operating point with nothing driven, at room temperature. */
	public static Edit add(Design design) {
		return new Edit("Add operating point", design, () -> {
			OperatingPoint point = GapwrightFactory.eINSTANCE.createOperatingPoint();
			point.setId(Ids.next(design, "point"));
			point.setTemperature(Quantity.parse("25 °C", Dimension.TEMPERATURE));
			design.getOperatingPoints().add(point);
		});
	}

	/** Adds a copy behind the original, with ids of its own. */
	public static Edit duplicate(OperatingPoint original) {
		Design design = (Design) original.eContainer();
		return new Edit("Duplicate operating point", design, () -> {
			Set<String> used = Ids.used(design);
			// the copy's drives keep pointing at the same windings
			OperatingPoint copy = EcoreUtil.copy(original);
			copy.setId(Ids.next(used, "point"));
			copy.setName(original.getName() == null ? null : original.getName() + " (copy)");
			copy.getDrives().forEach(drive -> drive.setId(Ids.next(used, "drive")));
			design.getOperatingPoints().add(design.getOperatingPoints().indexOf(original) + 1, copy);
		});
	}

	/** Connects a winding to a current in place of whatever it was connected to. */
	public static Edit driveByCurrent(OperatingPoint point, Winding winding) {
		return connect("Drive by current", point, winding, () -> {
			CurrentDrive drive = GapwrightFactory.eINSTANCE.createCurrentDrive();
			drive.setCurrent(Quantity.parse("1 A", Dimension.CURRENT));
			return drive;
		});
	}

	/** Connects a winding to a voltage in place of whatever it was connected to. */
	public static Edit driveByVoltage(OperatingPoint point, Winding winding) {
		return connect("Drive by voltage", point, winding, () -> {
			VoltageDrive drive = GapwrightFactory.eINSTANCE.createVoltageDrive();
			drive.setVoltage(Quantity.parse("24 V", Dimension.VOLTAGE));
			drive.setOnTime(Quantity.parse("5 µs", Dimension.TIME));
			return drive;
		});
	}

	/** Leaves a winding open. */
	public static Edit disconnect(OperatingPoint point, Winding winding) {
		return connect("Disconnect winding", point, winding, () -> null);
	}

	private static Edit connect(String label, OperatingPoint point, Winding winding, Supplier<Drive> maker) {
		return new Edit(label, point, () -> {
			point.getDrives().removeIf(drive -> drive.getWinding() == winding);
			Drive drive = maker.get();
			if (drive != null) {
				drive.setId(Ids.next((Design) point.eContainer(), "drive"));
				drive.setWinding(winding);
				point.getDrives().add(drive);
			}
		});
	}
}
