package gapwright.library;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotSame;
import static org.junit.jupiter.api.Assertions.assertNull;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;

import org.junit.jupiter.api.DynamicTest;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestFactory;

import gapwright.model.KneeCurve;
import gapwright.model.LegGeometry;
import gapwright.model.LinearCurve;
import gapwright.model.Material;
import gapwright.model.RollOffCurve;
import gapwright.model.SteinmetzLoss;
import gapwright.physics.material.BhCurve;
import gapwright.physics.material.RollOffBh;
import gapwright.study.MaterialLowering;

/** The stock materials agree with the class figures they were made from, and each says what it is. */
class StockMaterialsTest {

	/**
	 * A sheet's point the curve must pass through at 25 °C: H in A/m and B in T. Class figures, from memory: B of MnZn
	 * power ferrite is usually given at 1200 A/m, of NiZn at 3 kA/m, of non-oriented steel at 10 kA/m.
	 */
	private record SheetPoint(String material, double h, double b) {
	}

	private static final List<SheetPoint> SHEET_POINTS = List.of(new SheetPoint("mnzn-power-ferrite", 1200, 0.49),
			new SheetPoint("nizn-ferrite", 3000, 0.32), new SheetPoint("non-oriented-steel", 10e3, 1.9));

	/** A loss the class is known for, W/m³ at Hz and T; from memory, so to five per cent only. */
	private record LossPoint(String material, double frequency, double fluxDensity, double loss) {
	}

	private static final List<LossPoint> LOSS_POINTS = List.of(
			new LossPoint("mnzn-power-ferrite", 100e3, 0.2, 401e3), new LossPoint("nizn-ferrite", 1e6, 0.03, 203e3),
			new LossPoint("grain-oriented-steel", 50, 1.5, 1.0 * 7650),
			new LossPoint("non-oriented-steel", 50, 1.5, 3.5 * 7650),
			new LossPoint("nanocrystalline-ribbon", 100e3, 0.2, 400e3),
			new LossPoint("amorphous-ribbon", 20e3, 0.2, 262e3), new LossPoint("iron-powder-75", 100e3, 0.05, 1.2e6),
			new LossPoint("fesial-powder-60", 100e3, 0.05, 160e3), new LossPoint("nifemo-powder-60", 100e3, 0.05, 110e3),
			new LossPoint("feni-powder-60", 100e3, 0.05, 350e3));

	@TestFactory
	List<DynamicTest> curvePassesThroughTheSheetsPoint() {
		List<DynamicTest> tests = new ArrayList<>();
		for (SheetPoint point : SHEET_POINTS) {
			tests.add(DynamicTest.dynamicTest(point.material(),
					() -> assertEquals(point.b(), curve(point.material()).fluxDensity(point.h()), 1e-3 * point.b())));
		}
		return tests;
	}

	@TestFactory
	List<DynamicTest> lossIsThatOfTheClass() {
		List<DynamicTest> tests = new ArrayList<>();
		for (LossPoint point : LOSS_POINTS) {
			tests.add(DynamicTest.dynamicTest(point.material(), () -> {
				SteinmetzLoss loss = StockMaterials.get(point.material()).getLoss();
				double ours = loss.getCoefficient() * Math.pow(point.frequency(), loss.getFrequencyExponent())
						* Math.pow(point.fluxDensity(), loss.getFluxDensityExponent());
				assertEquals(point.loss(), ours, 0.05 * point.loss());
			}));
		}
		return tests;
	}

	@TestFactory
	List<DynamicTest> everyMaterialSaysWhereItsFiguresComeFrom() {
		return each(material -> {
			String source = material.getSource();
			assertTrue(source.contains("ndicative") && source.contains("replace them by your maker's data")
					|| source.contains("published"), source);
		});
	}

	/** Polarisation at a field no core meets, 10 MA/m, is within 30 per cent of the saturation given. */
	@TestFactory
	List<DynamicTest> curveTendsToTheSaturationGiven() {
		return each(material -> {
			if (material.getCurve() instanceof LinearCurve) {
				assertTrue(material.getSaturations().isEmpty());
				return;
			}
			double h = 10e6;
			double polarisation = MaterialLowering.curve(material.getCurve()).fluxDensity(h) - BhCurve.MU_0 * h;
			double saturation = material.getSaturations().get(0).getFluxDensity().si();
			assertEquals(saturation, polarisation, 0.3 * saturation);
			if (material.getCurve() instanceof RollOffCurve) {
				double limit = ((RollOffBh) MaterialLowering.curve(material.getCurve())).limitingPolarisation();
				// the tail falls as H^(1 − c), slowly for a small exponent
				assertTrue(polarisation < limit && polarisation > 0.9 * limit, polarisation + " of " + limit);
			}
			if (material.getCurve() instanceof KneeCurve knee) {
				assertEquals(knee.getSaturationPolarisation().si(), polarisation, 0.01 * polarisation);
			}
		});
	}

	@TestFactory
	List<DynamicTest> saturationNeverRisesWithTemperature() {
		return each(material -> {
			for (int i = 1; i < material.getSaturations().size(); i++) {
				assertTrue(LegGeometry.si(material.getSaturations().get(i).getTemperature()) > LegGeometry
						.si(material.getSaturations().get(i - 1).getTemperature()));
				assertTrue(LegGeometry.si(material.getSaturations().get(i).getFluxDensity()) <= LegGeometry
						.si(material.getSaturations().get(i - 1).getFluxDensity()));
			}
		});
	}

	/** Common practice: ferrite loses 20 to 25 per cent of its saturation from 25 to 100 °C. */
	@Test
	void ferritesLoseAFifthToAQuarterOfTheirSaturationWhenHot() {
		for (String id : List.of("mnzn-power-ferrite", "nizn-ferrite")) {
			Material ferrite = StockMaterials.get(id);
			double cold = ferrite.getSaturations().get(0).getFluxDensity().si();
			double hot = ferrite.getSaturations().get(1).getFluxDensity().si();
			assertTrue(1 - hot / cold >= 0.2 - 1e-9 && 1 - hot / cold <= 0.25 + 1e-9, id + " " + hot / cold);
		}
	}

	@Test
	void idsAreDistinctAndEveryCallGivesFreshCopies() {
		List<Material> materials = StockMaterials.all();
		assertEquals(materials.size(), new HashSet<>(materials.stream().map(Material::getId).toList()).size());
		assertNotSame(materials.get(0), StockMaterials.all().get(0));
		assertNull(materials.get(0).eContainer());
	}

	@Test
	void anUnknownMaterialIsNamedInTheMessage() {
		String message = assertThrows(IllegalArgumentException.class, () -> StockMaterials.get("unobtainium"))
				.getMessage();
		assertTrue(message.contains("unobtainium"), message);
	}

	private interface Check {
		void accept(Material material);
	}

	private static List<DynamicTest> each(Check check) {
		List<DynamicTest> tests = new ArrayList<>();
		for (Material material : StockMaterials.all()) {
			tests.add(DynamicTest.dynamicTest(material.getId(), () -> check.accept(material)));
		}
		assertTrue(tests.size() >= 12);
		return tests;
	}

	private static BhCurve curve(String material) {
		return MaterialLowering.curve(StockMaterials.get(material).getCurve());
	}
}
