package gapwright.physics.network;

/** Linkages were imposed on windings that link the same flux in proportion, so that no current is determined. */
public final class ImposedLinkagesConflictException extends RuntimeException {

	private static final long serialVersionUID = 1L;

	private final int winding;

	ImposedLinkagesConflictException(int winding) {
		super("winding " + winding + " links no flux of its own beside the other windings with an imposed linkage");
		this.winding = winding;
	}

	/** @return the winding whose current could not be determined */
	public int winding() {
		return winding;
	}
}
