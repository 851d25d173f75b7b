package gapwright.ui.session;

import java.util.concurrent.CancellationException;
import java.util.concurrent.Executor;
import java.util.function.Consumer;

import org.eclipse.core.runtime.IProgressMonitor;
import org.eclipse.core.runtime.IStatus;
import org.eclipse.core.runtime.Status;
import org.eclipse.core.runtime.jobs.Job;

import gapwright.study.Study;
import gapwright.study.StudyInput;
import gapwright.study.StudyResult;

/**
 * Reckons the newest state of a design, and only that: a small one at once, a large one in a job that a newer state
 * cancels. An answer to an older state is dropped.
 */
final class StudyRunner {

	/**
	 * Legs times operating points reckoned at once: 500 legs take about 1 ms warm, so this stays a small part of a
	 * frame of 16 ms, and figures do not flicker while such a design is dragged.
	 */
	static final int AT_ONCE = 2000;

	private final Executor ui;
	private final Consumer<StudyResult> taker;
	private int newest;
	private Job job;

	/**
	 * @param ui    runs on the UI thread
	 * @param taker gets each answer, on the UI thread
	 */
	StudyRunner(Executor ui, Consumer<StudyResult> taker) {
		this.ui = ui;
		this.taker = taker;
	}

	/** @param size legs times operating points of the input */
	void run(StudyInput input, int size) {
		int revision = supersede();
		if (size <= AT_ONCE) {
			taker.accept(Study.run(input));
		} else {
			job = new Answer(input, revision);
			job.schedule();
		}
	}

	/** Drops whatever is under way: the design has changed and cannot be reckoned as it is, or is closed. */
	int supersede() {
		if (job != null) {
			job.cancel();
			job = null;
		}
		return ++newest;
	}

	boolean isBusy() {
		return job != null;
	}

	private final class Answer extends Job {

		private final StudyInput input;
		private final int revision;

		Answer(StudyInput input, int revision) {
			super("Computing the design");
			this.input = input;
			this.revision = revision;
			setPriority(INTERACTIVE);
		}

		@Override
		protected IStatus run(IProgressMonitor monitor) {
			StudyResult result;
			try {
				result = Study.run(input, monitor::isCanceled);
			} catch (CancellationException e) {
				// a newer state of the design has overtaken this one
				return Status.CANCEL_STATUS;
			}
			ui.execute(() -> {
				if (revision == newest) {
					job = null;
					taker.accept(result);
				}
			});
			return Status.OK_STATUS;
		}
	}
}
