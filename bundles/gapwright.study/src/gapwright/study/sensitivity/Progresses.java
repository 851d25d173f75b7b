package gapwright.study.sensitivity;

import java.util.concurrent.CancellationException;

import gapwright.study.Progress;

final class Progresses {

	private Progresses() {
	}

	static void check(Progress progress) {
		if (progress.cancelled()) {
			throw new CancellationException();
		}
	}
}
