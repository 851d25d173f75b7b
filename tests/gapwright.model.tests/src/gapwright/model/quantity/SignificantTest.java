package gapwright.model.quantity;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.api.Test;

class SignificantTest {

	private static String prefixed(double value, int digits) {
		Significant.Prefixed scaled = Significant.prefixed(value, digits);
		return scaled.figure().toPlainString() + " " + scaled.prefix();
	}

	@Test
	void allDigitsAreKeptAndNoMore() {
		assertEquals("71.0", Significant.of(71, 3).toPlainString());
		assertEquals("-0.0012", Significant.of(-0.001234, 2).toPlainString());
		assertEquals("123000", Significant.of(123456, 3).toPlainString());
		assertEquals("0", Significant.of(-0.0, 3).toPlainString());
	}

	@Test
	void thePrefixFollowsTheRoundedFigure() {
		assertEquals("71.4 µ", prefixed(71.43e-6, 3));
		assertEquals("1.00 m", prefixed(999.7e-6, 3));
		assertEquals("999 µ", prefixed(999.4e-6, 3));
		assertEquals("14.00 ", prefixed(14, 4));
		assertEquals("-2.5 k", prefixed(-2477.3, 2));
		assertEquals("0 ", prefixed(0, 3));
	}

	@Test
	void beyondTheLastPrefixesTheFigureLeavesItsRange() {
		assertEquals("1230 T", prefixed(1.23e15, 3));
		assertEquals("0.00123 f", prefixed(1.23e-18, 3));
		assertEquals(308, Significant.exponent(Significant.of(Double.MAX_VALUE, 3)));
		assertEquals(-324, Significant.exponent(Significant.of(Double.MIN_VALUE, 3)));
	}
}
