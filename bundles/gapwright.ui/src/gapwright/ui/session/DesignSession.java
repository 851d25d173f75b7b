package gapwright.ui.session;

import java.util.List;
import java.util.concurrent.CopyOnWriteArrayList;
import java.util.concurrent.Executor;

import gapwright.model.Design;
import gapwright.model.OperatingPoint;
import gapwright.model.edit.history.EditHistory;
import gapwright.study.Lowering;
import gapwright.study.OperatingPointResult;
import gapwright.study.StudyResult;
import gapwright.study.tolerance.ToleranceResult;

/**
 * One design being worked on: its one history, its newest result, the chosen operating point and the shared
 * selection. A result is that of the design as it stands or there is none: no figure outlives the edit that made it
 * old. To be used from the UI thread.
 */
public final class DesignSession {

	private final Design design;
	private final EditHistory history = new EditHistory();
	private final SelectionHub selection = new SelectionHub();
	private final List<SessionListener> listeners = new CopyOnWriteArrayList<>();
	private final StudyRunner runner;
	private final Runnable historyListener = this::reckon;
	private final List<Runnable> bandListeners = new CopyOnWriteArrayList<>();
	private StudyResult result;
	private ToleranceResult bands;
	private String chosen;

	/** @param ui runs on the UI thread, later or at once */
	public DesignSession(Design design, Executor ui) {
		this.design = design;
		runner = new StudyRunner(ui, this::answered);
		history.addListener(historyListener);
		reckon();
	}

	private void reckon() {
		result = null;
		bands = null;
		runner.run(Lowering.of(design), design.getLegs().size() * design.getOperatingPoints().size());
		if (runner.isBusy()) {
			tell();
		}
	}

	private void answered(StudyResult answer) {
		result = answer;
		tell();
	}

	private void tell() {
		listeners.forEach(SessionListener::sessionChanged);
	}

	public Design design() {
		return design;
	}

	/** Where every edit goes, whoever makes it. */
	public EditHistory history() {
		return history;
	}

	public SelectionHub selection() {
		return selection;
	}

	/** The result of the design as it stands; null while it is being reckoned. */
	public StudyResult result() {
		return result;
	}

	/** What tolerances do to the design as it stands, when that has been worked out; else null. */
	public ToleranceResult bands() {
		return bands;
	}

	/** The bands of the chosen operating point; null where there are none. */
	public ToleranceResult.PointBands pointBands() {
		OperatingPoint point = operatingPoint();
		return bands == null || point == null ? null : bands.point(point.getId());
	}

	/** Keeps what tolerances do until the next edit. @param worked for the design as it stands */
	public void keepBands(ToleranceResult worked) {
		if (bands != worked) {
			bands = worked;
			bandListeners.forEach(Runnable::run);
		}
	}

	/** @param listener told when bands have come; that they are gone is a change of the session */
	public void addBandListener(Runnable listener) {
		bandListeners.add(listener);
	}

	public void removeBandListener(Runnable listener) {
		bandListeners.remove(listener);
	}

	/** The result at the chosen operating point; null where there is none. */
	public OperatingPointResult pointResult() {
		OperatingPoint point = operatingPoint();
		if (result == null || point == null) {
			return null;
		}
		return result.operatingPoints().stream().filter(each -> each.id().equals(point.getId())).findFirst().orElse(null);
	}

	/** The chosen operating point, the first one to begin with; null when the design has none. */
	public OperatingPoint operatingPoint() {
		List<OperatingPoint> points = design.getOperatingPoints();
		return points.stream().filter(point -> point.getId() != null && point.getId().equals(chosen)).findFirst()
				.orElse(points.isEmpty() ? null : points.get(0));
	}

	public void choose(OperatingPoint point) {
		if (point != operatingPoint()) {
			chosen = point.getId();
			tell();
		}
	}

	/** Why there are no figures to show, in a sentence for the user; empty when there are. */
	public String trouble() {
		return Trouble.of(this);
	}

	public void addListener(SessionListener listener) {
		listeners.add(listener);
	}

	public void removeListener(SessionListener listener) {
		listeners.remove(listener);
	}

	/** The editor closes. */
	public void dispose() {
		runner.supersede();
		history.removeListener(historyListener);
		history.dispose();
		listeners.clear();
		bandListeners.clear();
	}
}
