package gapwright.model.quantity;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.math.BigDecimal;
import java.util.Map;
import java.util.Random;

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
		assertEquals("'3 furlong': unknown unit 'furlong', expected a length, e.g. 0.5 mm",
				message("3 furlong", Dimension.LENGTH));
		assertEquals("'14 A': that is a current, expected a length, e.g. 0.5 mm", message("14 A", Dimension.LENGTH));
		assertEquals("'NaN mm': not a number, e.g. 0.5 mm", message("NaN mm", Dimension.LENGTH));
		assertEquals("'': empty, expected a length, e.g. 0.5 mm", message("", Dimension.LENGTH));
		assertEquals("'1e999 mm': out of the range of numbers, e.g. 0.5 mm", message("1e999 mm", Dimension.LENGTH));
	}

	@Test
	void aNumberWrittenByOtherHabitsIsAnsweredWithTheSpellingThatIsRead() {
		assertEquals("'0,5 mm': a comma is not read in numbers, write 0.5 mm", message("0,5 mm", Dimension.LENGTH));
		assertEquals("',5mm': a comma is not read in numbers, write 0.5 mm", message(",5mm", Dimension.LENGTH));
		assertEquals("'0,5': a comma is not read in numbers, write 0.5 with a unit, e.g. 0.5 mm",
				message("0,5", Dimension.LENGTH));
		assertEquals("'1,200 A/m': a comma is not read in numbers, write 1200 A/m or 1.200 A/m",
				message("1,200 A/m", Dimension.FIELD_STRENGTH));
		assertEquals("'1,200.5 A/m': a thousands mark is not read, write 1200.5 A/m",
				message("1,200.5 A/m", Dimension.FIELD_STRENGTH));
		assertEquals("'1.200,5 A/m': a thousands mark is not read, write 1200.5 A/m",
				message("1.200,5 A/m", Dimension.FIELD_STRENGTH));
		assertEquals("'1 200 A/m': a thousands mark is not read, write 1200 A/m",
				message("1 200 A/m", Dimension.FIELD_STRENGTH));
		assertEquals("'12'000 A/m': a thousands mark is not read, write 12000 A/m",
				message("12'000 A/m", Dimension.FIELD_STRENGTH));
		assertEquals("'24 AWG': the gauge comes first, write AWG 24", message("24 AWG", Dimension.WIRE));
		assertEquals("'∞ A': not a number, e.g. 14 A", message("∞ A", Dimension.CURRENT));
	}

	@Test
	void aUnitInTheWrongCaseIsAnsweredWithTheRightOnes() {
		assertEquals("'5 MM': unknown unit 'MM', did you mean Mm or mm?", message("5 MM", Dimension.LENGTH));
		assertEquals("'50 KHZ': unknown unit 'KHZ', did you mean kHz?", message("50 KHZ", Dimension.FREQUENCY));
	}

	@Test
	void blanksAndMinusSignsOfTextProcessorsAreRead() {
		assertEquals(0.5e-3, si("0.5\u00A0mm", Dimension.LENGTH), 0);
		assertEquals(0.5e-3, si("0.5\u202Fmm", Dimension.LENGTH), 0);
		assertEquals(-5, si("\u22125 A", Dimension.CURRENT), 0);
		assertEquals("\u22125 A", Quantity.parse("\u22125 A", Dimension.CURRENT).text());
		assertEquals(4800, si("4800 kg / m3", Dimension.DENSITY), 0);
		assertEquals(40, si("40 deg C", Dimension.TEMPERATURE), 0);
	}

	/** Each of 20 000 random decimals in each prefix is the double nearest to the exact product. Seed printed on failure. */
	@Test
	void everyPrefixedValueIsTheNearestDouble() {
		Map<String, Integer> exponents = Map.of("fA", -15, "pA", -12, "nA", -9, "µA", -6, "mA", -3, "A", 0, "kA", 3, "MA", 6,
				"GA", 9, "TA", 12);
		Random random = new Random(20);
		for (int i = 0; i < 20_000; i++) {
			BigDecimal magnitude = BigDecimal.valueOf(random.nextLong(), random.nextInt(25));
			exponents.forEach((unit, exponent) -> {
				double nearest = Double.parseDouble(magnitude.scaleByPowerOfTen(exponent).toString());
				String text = magnitude.toPlainString() + " " + unit;
				assertEquals(nearest, si(text, Dimension.CURRENT), 0, text);
			});
		}
	}

	@Test
	void aTextOfAMillionDigitsIsRefusedAtOnce() {
		String text = "9".repeat(1_000_000);
		assertEquals("'" + "9".repeat(100) + "…': too long for a quantity, e.g. 0.5 mm", message(text + " mm", Dimension.LENGTH));
	}

	@Test
	void aValueTooSmallForANumberIsNotTakenForZero() {
		assertEquals("'1e-900 m': out of the range of numbers, e.g. 0.5 mm", message("1e-900 m", Dimension.LENGTH));
		assertEquals(0, si("0e-900 m", Dimension.LENGTH), 0);
	}

	/** Handbook diameters of bare round wire (ASTM B258 table, mm, three digits; from memory). */
	@Test
	void gaugesMeetTheHandbookTable() {
		assertEquals(2.588, si("AWG 10", Dimension.WIRE) * 1e3, 5e-4);
		assertEquals(1.024, si("AWG 18", Dimension.WIRE) * 1e3, 5e-4);
		assertEquals(0.511, si("AWG 24", Dimension.WIRE) * 1e3, 5e-4);
		assertEquals(0.255, si("awg 30", Dimension.WIRE) * 1e3, 5e-4);
		assertEquals(0.0799, si("AWG40", Dimension.WIRE) * 1e3, 5e-5);
	}
}
