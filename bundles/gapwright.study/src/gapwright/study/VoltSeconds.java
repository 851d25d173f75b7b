package gapwright.study;

import gapwright.model.VoltageDrive;

/** What a voltage pulse does to the linkage, from Faraday's law dλ/dt = v with the drop across the resistance left out. */
public final class VoltSeconds {

	private VoltSeconds() {
	}

	/** @return swing of the linkage, peak to peak, Wb: the area under the pulse */
	public static double of(VoltageDrive drive) {
		double rectangle = drive.getVoltage().si() * drive.getOnTime().si();
		return switch (drive.getWaveform()) {
		case RECTANGULAR -> rectangle;
		case TRIANGULAR -> rectangle / 2;
		case SINUSOIDAL -> rectangle * 2 / Math.PI;
		};
	}
}
