package gapwright.cli;

/** Version of the tool. */
final class Version {

	/** As in the bundles' manifests, without the build's qualifier; a test compares them. */
	static final String NUMBER = "0.1.0";

	private Version() {
	}
}
