package gapwright.library.material;

import java.util.List;

import gapwright.model.Material;
import gapwright.physics.material.SteinmetzFit;

/**
 * What came of reading a material file: the whole material, or the reasons why not. Nothing is ever half-loaded.
 *
 * @param material in no design yet; null when there are problems
 * @param problems in the order of the file
 * @param remarks  sentences on what is doubtful or left out, though the file was read
 * @param doubts   units that look mistaken
 * @param lossFit  the fit behind the loss figures; null where they are given outright or not at all
 */
public record MaterialReading(Material material, List<FileProblem> problems, List<String> remarks,
		List<UnitDoubt> doubts, SteinmetzFit lossFit) {

	public MaterialReading {
		problems = List.copyOf(problems);
		remarks = List.copyOf(remarks);
		doubts = List.copyOf(doubts);
	}

	static MaterialReading refused(List<FileProblem> problems) {
		return new MaterialReading(null, problems, List.of(), List.of(), null);
	}
}
