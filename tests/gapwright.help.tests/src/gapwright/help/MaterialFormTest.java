package gapwright.help;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotNull;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

import org.junit.jupiter.api.Test;

import gapwright.library.material.BareUnits;
import gapwright.library.material.MaterialFile;
import gapwright.library.material.MaterialReading;

/** The material file printed in the guide is one. */
class MaterialFormTest {

	@Test
	void thePrintedMaterialFileIsReadWithoutARemark() throws IOException {
		String page = Files.readString(Path.of("../../bundles/gapwright.help/html/materials.html"));
		Matcher printed = Pattern.compile("<pre>(gapwright-material,1.*?)</pre>", Pattern.DOTALL).matcher(page);
		assertTrue(printed.find());
		MaterialReading reading = MaterialFile.read(printed.group(1).getBytes(StandardCharsets.UTF_8), BareUnits.AS_IN_FILE);
		assertEquals(List.of(), reading.problems());
		assertEquals(List.of(), reading.remarks());
		assertEquals(List.of(), reading.doubts());
		assertNotNull(reading.material().getLoss());
	}
}
