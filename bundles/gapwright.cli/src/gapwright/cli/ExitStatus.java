package gapwright.cli;

/** What the command tells the shell. */
final class ExitStatus {

	static final int WITHIN = 0;
	static final int NEAR = 1;
	static final int OVER = 2;
	/** Wrong usage; as EX_USAGE of sysexits. */
	static final int USAGE = 64;
	/** A design that cannot be read or solved; as EX_DATAERR of sysexits. */
	static final int DATA = 65;
	/** A fault of this program; as EX_SOFTWARE of sysexits. */
	static final int FAULT = 70;

	private ExitStatus() {
	}

	/** @return the one that asks for more attention */
	static int worse(int first, int second) {
		return Math.max(first, second);
	}
}
