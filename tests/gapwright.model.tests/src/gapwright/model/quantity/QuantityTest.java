package gapwright.model.quantity;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import org.junit.jupiter.api.Test;

class QuantityTest {

	private static double si(String text, Dimension dimension) {
		return Quantity.parse(text, dimension).si();
	}

	@Test
	void theValueIsTheOneJavaWouldReadInSi() {
		assertEquals(0.8e-3, si("0.8 mm", Dimension.LENGTH), 0);
		assertEquals(1.2e-4, si("1.2 cm²", Dimension.AREA), 0);
		assertEquals(5e-6, si("5 µs", Dimension.TIME), 0);
		assertEquals(0.39, si("390 mT", Dimension.FLUX_DENSITY), 0);
		assertEquals(100, si("100 °C", Dimension.TEMPERATURE), 0);
		assertEquals(-14, si("-14 A", Dimension.CURRENT), 0);
		assertEquals(2e-8, si("20 nH", Dimension.PERMEANCE), 0);
	}

	/** 1 in = 25.4 mm, 1 mil = 25.4 µm, 1 G = 0.1 mT exactly; 1 Oe = 1000/(4π) A/m. Source: definitions. */
	@Test
	void oldUnitsAreConvertedByTheirDefinition() {
		assertEquals(0.0254, si("1 in", Dimension.LENGTH), 0);
		assertEquals(508e-6, si("20 mil", Dimension.LENGTH), 1e-18);
		assertEquals(0.39, si("3900 G", Dimension.FLUX_DENSITY), 0);
		assertEquals(1000 / (4 * Math.PI), si("1 Oe", Dimension.FIELD_STRENGTH), 1e-13);
		assertEquals(26.85, si("300 K", Dimension.TEMPERATURE), 1e-12);
	}

	/** ASTM B258 (from memory): AWG 36 is 0.005 in, AWG 0000 is 0.46 in, both exactly. */
	@Test
	void wireGaugesFollowTheirDefiningFormula() {
		assertEquals(0.127e-3, si("AWG 36", Dimension.WIRE), 1e-15);
		assertEquals(11.684e-3, si("AWG -3", Dimension.WIRE), 1e-12);
		assertEquals(1.0e-3, si("1 mm", Dimension.WIRE), 0);
		assertEquals("'AWG 99': no such wire gauge, AWG -3 (4/0) to AWG 56", message("AWG 99", Dimension.WIRE));
	}

	@Test
	void spellingsOfOneUnitMeanTheSame() {
		for (String text : new String[] { "3 µm", "3 μm", "3 um", "3um", "0.003 mm", "3e-6 m" }) {
			assertEquals(3e-6, si(text, Dimension.LENGTH), 0, text);
		}
		for (String text : new String[] { "180 mm²", "180 mm2", "180 mm^2", "1.8 cm2" }) {
			assertEquals(1.8e-4, si(text, Dimension.AREA), 0, text);
		}
		for (String text : new String[] { "40 °C", "40 degC", "40 ℃" }) {
			assertEquals(40, si(text, Dimension.TEMPERATURE), 0, text);
		}
		assertEquals(0.03, si("30 mΩ", Dimension.RESISTANCE), 0);
		assertEquals(0.03, si("30 mohm", Dimension.RESISTANCE), 0);
	}

	@Test
	void whatWasTypedStaysAsItIs() {
		assertEquals("0.80 mm", Quantity.parse(" 0.80 mm ", Dimension.LENGTH).text());
		assertEquals("20mil", Quantity.parse("20mil", Dimension.LENGTH).text());
		assertNotEquals(Quantity.parse("1 mm", Dimension.LENGTH), Quantity.parse("1.0 mm", Dimension.LENGTH));
		assertEquals("mm", Quantity.parse("0.80 mm", Dimension.LENGTH).unit());
		assertEquals("10 mm", Quantity.of(10, "mm", Dimension.LENGTH).text());
		assertEquals("0.25 mm", Quantity.of(0.25, "mm", Dimension.LENGTH).text());
	}

	private static String message(String text, Dimension dimension) {
		return assertThrows(QuantityFormatException.class, () -> Quantity.parse(text, dimension)).getMessage();
	}

	@Test
	void aBadQuantityIsRefusedWithWhatWouldDo() {
		assertEquals("'0.5': a length needs a unit, e.g. 0.5 mm", message("0.5", Dimension.LENGTH));
		assertEquals("'0,5 mm': a comma is not read in numbers, write a decimal point, e.g. 0.5 mm",
				message("0,5 mm", Dimension.LENGTH));
		assertEquals("'1,200 A/m': a comma is not read in numbers, write a decimal point, e.g. 1200 A/m",
				message("1,200 A/m", Dimension.FIELD_STRENGTH));
		assertEquals("'3 furlong': unknown unit 'furlong', expected a length, e.g. 0.5 mm",
				message("3 furlong", Dimension.LENGTH));
		assertEquals("'14 A': that is a current, expected a length, e.g. 0.5 mm", message("14 A", Dimension.LENGTH));
		assertEquals("'NaN mm': not a number with a unit, e.g. 0.5 mm", message("NaN mm", Dimension.LENGTH));
		assertEquals("'': empty, expected a length, e.g. 0.5 mm", message("", Dimension.LENGTH));
		assertEquals("'1e999 mm': out of the range of numbers, e.g. 0.5 mm", message("1e999 mm", Dimension.LENGTH));
	}
}
