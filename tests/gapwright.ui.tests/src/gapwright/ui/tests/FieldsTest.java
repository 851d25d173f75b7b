package gapwright.ui.tests;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertNotNull;
import static org.junit.jupiter.api.Assertions.assertNull;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;

import org.eclipse.emf.ecore.EClass;
import org.eclipse.emf.ecore.EClassifier;
import org.eclipse.emf.ecore.EEnum;
import org.eclipse.emf.ecore.EStructuralFeature;
import org.junit.jupiter.api.Test;

import gapwright.model.GapwrightPackage;
import gapwright.model.quantity.Dimension;
import gapwright.model.quantity.Quantity;
import gapwright.ui.fields.BadEntryException;
import gapwright.ui.fields.Entries;
import gapwright.ui.fields.Entry;
import gapwright.ui.fields.EntryState;
import gapwright.ui.fields.FeatureText;
import gapwright.ui.fields.FigureFormat;

/** Fields and figures, without a window. */
class FieldsTest {

	/** Engineering prefixes: exponents that are multiples of three (SI prefixes, SI Brochure; from memory). */
	@Test
	void figuresHaveThreeDigitsAndAPrefixOfEngineering() {
		assertEquals("71.4 µH", FigureFormat.si(71.38e-6, "H"));
		assertEquals("1.00 mH", FigureFormat.si(999.7e-6, "H"), "rounded first, then prefixed");
		assertEquals("999 µH", FigureFormat.si(999.4e-6, "H"));
		assertEquals("−1.25 kA/m", FigureFormat.si(-1250, "A/m"));
		assertEquals("14.0 A", FigureFormat.si(14, "A"));
		assertEquals("0 A", FigureFormat.si(0, "A"));
		assertEquals("1.00 pWb", FigureFormat.si(1e-12, "Wb"));
		assertEquals("12.3 TA", FigureFormat.si(12.3e12, "A"));
		assertEquals("–", FigureFormat.si(Double.NaN, "A"), "never nought for what is not known");
	}

	@Test
	void fluxDensitiesOfACoreCompareAtAGlance() {
		assertEquals("0.257 T", FigureFormat.fluxDensity(0.2571));
		assertEquals("−1.87 T", FigureFormat.fluxDensity(-1.871));
		assertEquals("0.0123 T", FigureFormat.fluxDensity(0.01234));
		assertEquals("120 µT", FigureFormat.fluxDensity(120e-6));
	}

	@Test
	void percentagesAreWholeFromTen() {
		assertEquals("66 %", FigureFormat.percent(0.6583));
		assertEquals("104 %", FigureFormat.percent(1.04));
		assertEquals("1.2 %", FigureFormat.percent(0.0123));
		assertEquals("–", FigureFormat.percent(Double.NaN));
	}

	@Test
	void plainFiguresOutsideTheUsualRangeArePowersOfTen() {
		assertEquals("1.23·10⁻⁴", FigureFormat.plain(0.000123));
		assertEquals("1.50·10⁶", FigureFormat.plain(1.5e6));
		assertEquals("150000", FigureFormat.plain(1.5e5));
		assertEquals("∞", FigureFormat.plain(Double.POSITIVE_INFINITY));
	}

	@Test
	void lengthsAndAreasAreInMillimetresAsOnDrawings() {
		assertEquals("0.500 mm", FigureFormat.length(0.5e-3));
		assertEquals("120 mm²", FigureFormat.area(1.2e-4));
	}

	@Test
	void aQuantityFieldTakesWhatTheFileTakes() throws Exception {
		Entry<Quantity> length = Entries.quantity(Dimension.LENGTH, false);
		for (String typed : List.of("0.5mm", " 0.5 mm ", "20 mil", "500 um")) {
			assertNotNull(length.parse(typed), typed);
		}
		assertEquals("0.5mm", length.text(length.parse("0.5mm")), "as typed, not as somebody else would write it");
		assertEquals(0.000508, length.parse("20 mil").si(), 1e-15);
		for (String typed : List.of("", "0.5", "0,5 mm", "0.5 A", "wide", "0.5 furlongs")) {
			assertFalse(assertThrows(BadEntryException.class, () -> length.parse(typed), typed).getMessage().isBlank());
		}
		assertNull(Entries.quantity(Dimension.LENGTH, true).parse(" "), "left out");
	}

	@Test
	void numbersAreWrittenWithAPointAndMeasuredAgainstTheirKind() throws Exception {
		assertEquals(0.95, Entries.number(false).parse("0.95"));
		assertEquals("2300", Entries.number(false).text(2300.0));
		assertTrue(assertThrows(BadEntryException.class, () -> Entries.number(false).parse("0,95")).getMessage().contains("0.95"));
		for (String typed : List.of("NaN", "Infinity", "0x10", "1d", "1..2", "ten")) {
			assertThrows(BadEntryException.class, () -> Entries.number(false).parse(typed), typed);
		}
		assertThrows(BadEntryException.class, () -> Entries.whole(false).parse("12.5"));
	}

	@Test
	void aBadEntryKeepsTheLastValueAndIsForgivenWhenItIsMended() {
		EntryState<Quantity> state = new EntryState<>(Entries.quantity(Dimension.LENGTH, false));
		Quantity before = Quantity.parse("1 mm", Dimension.LENGTH);
		state.accept(before, false);
		state.type("2");
		assertNull(state.problem(), "no complaint before somebody has finished typing");
		assertFalse(state.commit());
		assertNotNull(state.problem());
		assertEquals(before, state.value());
		assertEquals("2", state.typed());
		state.type("2 mm");
		assertNull(state.problem());
		assertTrue(state.commit());
		assertEquals("2 mm", state.value().text());
	}

	@Test
	void anEditMadeElsewhereDoesNotPullAHalfTypedEntryAway() {
		EntryState<Quantity> state = new EntryState<>(Entries.quantity(Dimension.LENGTH, false));
		state.accept(Quantity.parse("1 mm", Dimension.LENGTH), false);
		state.type("3.");
		assertFalse(state.accept(Quantity.parse("5 mm", Dimension.LENGTH), true));
		assertEquals("3.", state.typed());
		state.revert();
		assertEquals("5 mm", state.typed(), "what Esc puts back is the newest value");
	}

	@Test
	void everyFeatureAndEveryChoiceHasWordsForTheUser() {
		for (EClassifier type : GapwrightPackage.eINSTANCE.getEClassifiers()) {
			if (type instanceof EClass kind) {
				for (EStructuralFeature feature : kind.getEStructuralFeatures()) {
					assertFalse(FeatureText.label(feature).isBlank(), feature.getName());
					assertTrue(FeatureText.hint(feature).endsWith("."), feature.getName() + ": a hint is a sentence");
				}
			} else if (type instanceof EEnum choices) {
				choices.getELiterals().forEach(literal -> assertFalse(FeatureText.label(choices, literal.getInstance()).isBlank()));
			}
		}
	}

	@Test
	void aKindIsSaidInWords() {
		assertEquals("operating point", FeatureText.kind(GapwrightPackage.Literals.OPERATING_POINT));
		assertEquals("leg", FeatureText.kind(GapwrightPackage.Literals.LEG));
	}
}
