package gapwright.report;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.api.Test;

class EngineeringTest {

	@Test
	void figuresKeepTheirDigitsAndTakeAPrefixBetweenOneAndAThousand() {
		assertEquals("71.4 µH", Engineering.of(71.43e-6, "H", 3));
		assertEquals("55.33 µWb", Engineering.of(55.331e-6, "Wb", 4));
		assertEquals("2.477 kA", Engineering.of(2477.3, "A", 4));
		assertEquals("1.135 µH", Engineering.of(1.1349e-6, "H", 4));
		assertEquals("14.00 A", Engineering.of(14, "A", 4));
		assertEquals("150.0 mT", Engineering.of(0.15, "T", 4));
	}

	@Test
	void roundingUpMovesOnToTheNextPrefix() {
		assertEquals("1.000 kA", Engineering.of(999.96, "A", 4));
		assertEquals("1.00 H", Engineering.of(0.9996, "H", 3));
		assertEquals("999.9 A", Engineering.of(999.94, "A", 4));
	}

	@Test
	void negativeFiguresKeepTheirSign() {
		assertEquals("-25.22 µH", Engineering.of(-25.22e-6, "H", 4));
	}

	@Test
	void zeroHasNoPrefixAndNoNumberIsADash() {
		assertEquals("0 A", Engineering.of(0, "A", 4));
		assertEquals("0 A", Engineering.of(-0.0, "A", 4));
		assertEquals("–", Engineering.of(Double.NaN, "A", 4));
		assertEquals("–", Engineering.of(Double.POSITIVE_INFINITY, "A", 4));
		assertEquals("–", Engineering.perCent(Double.NaN));
	}

	@Test
	void beyondTheLastPrefixTheFigureGrowsInstead() {
		assertEquals("1.235 TA", Engineering.of(1.2346e12, "A", 4));
		assertEquals("1234567 TA", Engineering.of(1.234567e18, "A", 7));
		assertEquals("0.001230 fA", Engineering.of(1.23e-18, "A", 4));
	}

	@Test
	void perCentHasOneDecimal() {
		assertEquals("86.4 %", Engineering.perCent(0.8644));
		assertEquals("105.8 %", Engineering.perCent(1.058));
	}
}
