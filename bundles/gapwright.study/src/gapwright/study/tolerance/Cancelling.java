package gapwright.study.tolerance;

import java.util.concurrent.CancellationException;

import gapwright.study.Progress;

final class Cancelling {

	private Cancelling() {
	}

	static void check(Progress progress) {
		if (progress.cancelled()) {
			throw new CancellationException();
		}
	}
}
