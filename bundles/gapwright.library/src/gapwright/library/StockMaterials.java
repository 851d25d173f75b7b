package gapwright.library;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.util.List;

import org.eclipse.emf.ecore.util.EcoreUtil;

import gapwright.model.DesignReader;
import gapwright.model.Material;

/** Materials to copy into a design: generic classes with indicative figures, each saying where they come from. */
public final class StockMaterials {

	private static final String FILE = "/data/materials/stock.gapwright";

	private StockMaterials() {
	}

	/** @return fresh copies in the library's order, in no design */
	public static List<Material> all() {
		try (InputStream input = StockMaterials.class.getResourceAsStream(FILE)) {
			return List.copyOf(EcoreUtil.copyAll(DesignReader.read(input, "stock.gapwright").getMaterials()));
		} catch (IOException e) {
			throw new UncheckedIOException(e);
		}
	}

	/**
	 * @param id for example "mnzn-power-ferrite"
	 * @return a fresh copy, in no design
	 * @throws IllegalArgumentException when there is none
	 */
	public static Material get(String id) {
		return all().stream().filter(material -> material.getId().equals(id)).findFirst()
				.orElseThrow(() -> new IllegalArgumentException("no stock material '" + id + "'"));
	}
}
