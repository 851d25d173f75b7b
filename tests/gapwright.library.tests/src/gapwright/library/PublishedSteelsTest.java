package gapwright.library;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;

import gapwright.model.CurvePoint;
import gapwright.model.Material;
import gapwright.model.TableCurve;
import gapwright.physics.material.BhCurve;
import gapwright.physics.material.Permeability;
import gapwright.physics.material.TableBh;
import gapwright.study.MaterialData;

/** The steels of the library against what is printed about them elsewhere. */
class PublishedSteelsTest {

	/** Table of TEAM Workshop problem 13, every other point as published with the problem: A/m, T. */
	@Test
	void theWorkshopsSteelIsThePublishedTable() {
		double[][] published = { { 16, 0.0025 }, { 54, 0.0125 }, { 143, 0.05 }, { 210, 0.2 }, { 233, 0.4 }, { 258, 0.6 },
				{ 289, 0.8 }, { 342, 1.0 }, { 433, 1.2 }, { 648, 1.4 }, { 933, 1.5 }, { 1228, 1.55 }, { 1934, 1.6 },
				{ 2913, 1.65 }, { 4993, 1.7 }, { 7189, 1.75 }, { 9423, 1.8 } };
		BhCurve steel = curve("team-13-steel");
		for (double[] point : published) {
			assertEquals(point[1], steel.fluxDensity(point[0]), 1e-12);
		}
	}

	/** H = (k₁·exp(k₂·B²) + k₃)·B, Brauer, IEEE Trans. Magnetics 1975; law and constants from memory. */
	@Test
	void theTablesFollowThePublishedLawBetweenTheirPointsToo() {
		law("cast-steel", 49.4, 1.46, 520.6, 2.1);
		law("cold-rolled-steel", 2.6, 2.72, 154.4, 1.85);
	}

	private static void law(String id, double k1, double k2, double k3, double end) {
		BhCurve steel = curve(id);
		for (double b = 0.03; b < end; b += 0.017) {
			double h = (k1 * Math.exp(k2 * b * b) + k3) * b;
			assertEquals(b, steel.fluxDensity(h), 0.004, id + " at " + h + " A/m");
		}
	}

	/**
	 * Textbook magnetisation curves of cast and of sheet steel (from memory, read off graphs): cast steel takes about 750
	 * A/m for 1 T; cold-rolled sheet about 200 A/m; a tenth more or less.
	 */
	@Test
	void oneTeslaTakesWhatTextbooksShow() {
		assertEquals(750, curve("cast-steel").fieldStrength(1), 75);
		assertEquals(200, curve("cold-rolled-steel").fieldStrength(1), 20);
	}

	/** EN 10106, least polarisation of grade M400-50A: 1.53, 1.63, 1.73 T at 2.5, 5, 10 kA/m; from memory. */
	@Test
	void theGenericSheetMeetsTheStandardsLeastPolarisation() {
		BhCurve sheet = curve("non-oriented-steel");
		double[][] least = { { 2500, 1.53 }, { 5000, 1.63 }, { 10_000, 1.73 } };
		for (double[] point : least) {
			double polarisation = sheet.fluxDensity(point[0]) - BhCurve.MU_0 * point[0];
			assertTrue(polarisation >= point[1] && polarisation < point[1] + 0.25, polarisation + " T at " + point[0] + " A/m");
		}
	}

	/** EN 10107, conventional grain-oriented sheet: at least 1.75 T at 800 A/m along the rolling direction; from memory. */
	@Test
	void theGenericOrientedSheetMeetsTheStandardsLeastPolarisation() {
		assertTrue(curve("grain-oriented-steel").fluxDensity(800) >= 1.75);
	}

	/** No point of a library's table rises slower than air, and each table ends where it is all but saturated. */
	@Test
	void everyTableEndsSaturated() {
		int tables = 0;
		for (Material material : StockMaterials.all()) {
			if (material.getCurve() instanceof TableCurve given) {
				TableBh table = (TableBh) new MaterialData(material).curve(25);
				assertTrue(table.endPermeability() >= 1 && table.endPermeability() < 20, material.getId());
				CurvePoint last = given.getPoints().get(given.getPoints().size() - 1);
				assertEquals(material.getSaturations().get(0).getFluxDensity().si(), last.getFluxDensity().si());
				double knee = Permeability.knee(table).orElseThrow();
				assertTrue(knee > 0.4 * last.getFluxDensity().si() && knee < last.getFluxDensity().si());
				tables++;
			}
		}
		assertEquals(3, tables);
	}

	/** Hot ferrite: the class figures B at 1200 A/m (MnZn) and 3 kA/m (NiZn), 25 and 100 °C, from memory. */
	@Test
	void ferriteCurvesPassThroughTheSheetsPointHotAndCold() {
		assertEquals(0.49, at("mnzn-power-ferrite", 25, 1200), 1e-3);
		assertEquals(0.39, at("mnzn-power-ferrite", 100, 1200), 1e-3);
		assertEquals(0.32, at("nizn-ferrite", 25, 3000), 1e-3);
		assertEquals(0.24, at("nizn-ferrite", 100, 3000), 1e-3);
	}

	/** Orders of the Curie temperature, from memory: MnZn 200 to 230 °C, iron 770 °C, iron-silicon 730 to 750 °C. */
	@Test
	void curieTemperaturesAreOfTheClass() {
		assertTrue(curie("mnzn-power-ferrite") >= 200 && curie("mnzn-power-ferrite") <= 230);
		assertEquals(770, curie("soft-iron"));
		assertTrue(curie("grain-oriented-steel") >= 730 && curie("grain-oriented-steel") <= 750);
		for (Material material : StockMaterials.all()) {
			assertTrue(material.getId().equals("nonmagnetic") == (material.getCurieTemperature() == null), material.getId());
		}
	}

	private static double curie(String id) {
		return StockMaterials.get(id).getCurieTemperature().si();
	}

	private static double at(String id, double celsius, double h) {
		return new MaterialData(StockMaterials.get(id)).curve(celsius).fluxDensity(h);
	}

	private static BhCurve curve(String id) {
		return new MaterialData(StockMaterials.get(id)).curve(25);
	}
}
