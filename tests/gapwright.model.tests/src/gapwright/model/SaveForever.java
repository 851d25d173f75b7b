package gapwright.model;

import java.io.IOException;
import java.nio.file.Path;
import java.util.Arrays;

/** Saves two contents in turn until it is killed; says "!" when it begins and "." after each save. */
final class SaveForever {

	private SaveForever() {
	}

	/** @return two megabytes of one letter */
	static byte[] content(int turn) {
		byte[] content = new byte[2 << 20];
		Arrays.fill(content, (byte) ('a' + turn));
		return content;
	}

	public static void main(String[] arguments) throws IOException {
		Path file = Path.of(arguments[0]);
		byte[][] contents = { content(0), content(1) };
		System.out.print("!");
		System.out.flush();
		for (int turn = 1;; turn++) {
			AtomicFile.write(file, contents[turn % 2]);
			System.out.print(".");
			System.out.flush();
		}
	}
}
