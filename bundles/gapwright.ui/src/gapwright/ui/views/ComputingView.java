package gapwright.ui.views;

import java.util.concurrent.CancellationException;

import org.eclipse.core.runtime.IProgressMonitor;
import org.eclipse.core.runtime.IStatus;
import org.eclipse.core.runtime.Status;
import org.eclipse.core.runtime.jobs.Job;
import org.eclipse.swt.widgets.Control;

import gapwright.study.Lowering;
import gapwright.study.Progress;
import gapwright.study.StudyInput;
import gapwright.ui.session.DesignSession;

/**
 * A view whose figures take longer than a frame: worked out in a job that a newer state of the design cancels. What is
 * shown always belongs to the design as it stands.
 *
 * @param <R> what is worked out
 */
abstract class ComputingView<R> extends DesignView {

	/** ms to wait for the next step of a drag. */
	private static final int PATIENCE = 120;
	private static final int WHOLE = 1000;

	private int newest;
	private Job job;

	/** What the job is called in the Progress view. */
	abstract String task();

	/** Runs outside the UI thread. @throws IllegalArgumentException with a sentence for the user */
	abstract R compute(StudyInput input, String operatingPoint, Progress progress);

	/** Shows figures of the design as it stands. */
	abstract void showFigures(DesignSession shown, R figures);

	/** Shows a sentence instead of figures. */
	abstract void say(String sentence);

	@Override
	final void showResult(DesignSession shown) {
		supersede();
		if (startsByItself()) {
			start(shown);
		} else {
			idle(shown);
		}
	}

	/** @return whether figures are worked out after every edit, or only when asked for */
	boolean startsByItself() {
		return true;
	}

	/** Shows what there is to do where figures are only worked out when asked for. */
	void idle(DesignSession shown) {
		// starts by itself
	}

	/** Works the figures out anew, once no other edit has come for a moment. */
	final void start(DesignSession shown) {
		int revision = supersede();
		say("Computing…");
		String point = shown.operatingPoint().getId();
		Control control = anchor();
		control.getDisplay().timerExec(PATIENCE, () -> {
			if (revision == newest && !control.isDisposed()) {
				job = new Work(Lowering.of(shown.design()), point, shown, revision);
				job.schedule();
			}
		});
	}

	/** Any control of the view. */
	abstract Control anchor();

	final boolean isBusy() {
		return job != null;
	}

	/** Drops whatever is under way. */
	final int supersede() {
		if (job != null) {
			job.cancel();
			job = null;
		}
		return ++newest;
	}

	@Override
	void clear() {
		supersede();
		say("");
	}

	@Override
	public void dispose() {
		supersede();
		super.dispose();
	}

	private final class Work extends Job {

		private final StudyInput input;
		private final String point;
		private final DesignSession shown;
		private final int revision;

		Work(StudyInput input, String point, DesignSession shown, int revision) {
			super(task());
			this.input = input;
			this.point = point;
			this.shown = shown;
			this.revision = revision;
		}

		@Override
		protected IStatus run(IProgressMonitor monitor) {
			monitor.beginTask(task(), WHOLE);
			Runnable answer;
			try {
				R figures = compute(input, point, new MonitorProgress(monitor));
				answer = () -> showFigures(shown, figures);
			} catch (CancellationException e) {
				answer = () -> say("Stopped.");
			} catch (IllegalArgumentException e) {
				answer = () -> say(e.getMessage());
			}
			Runnable told = answer;
			anchorDisplay(() -> {
				if (revision == newest && !anchor().isDisposed()) {
					job = null;
					told.run();
				}
			});
			return monitor.isCanceled() ? Status.CANCEL_STATUS : Status.OK_STATUS;
		}

		private void anchorDisplay(Runnable run) {
			getSite().getWorkbenchWindow().getWorkbench().getDisplay().asyncExec(run);
		}
	}

	/** A job's monitor as the physics sees it. */
	private static final class MonitorProgress implements Progress {

		private final IProgressMonitor monitor;
		private int told;

		MonitorProgress(IProgressMonitor monitor) {
			this.monitor = monitor;
		}

		@Override
		public boolean cancelled() {
			return monitor.isCanceled();
		}

		@Override
		public void done(double fraction) {
			int now = (int) (fraction * WHOLE);
			if (now > told) {
				monitor.worked(now - told);
				told = now;
			}
		}
	}
}
