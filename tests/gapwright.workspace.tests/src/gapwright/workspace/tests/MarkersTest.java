package gapwright.workspace.tests;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Files;
import java.util.List;

import org.eclipse.core.resources.IFile;
import org.eclipse.core.resources.IMarker;
import org.eclipse.core.resources.IResource;
import org.eclipse.core.runtime.CoreException;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;

import gapwright.workspace.DesignFileCheck;
import gapwright.workspace.DesignFiles;
import gapwright.workspace.FindingMarkers;

/** What a designer finds in the Problems view after a build. */
class MarkersTest {

	private Station station;

	@BeforeEach
	void open() throws CoreException {
		station = new Station("markers");
	}

	@AfterEach
	void close() throws CoreException {
		station.delete();
	}

	@Test
	void aLegNearSaturationIsMarkedWithElementAndOperatingPoint() throws Exception {
		IFile file = station.write("choke.gapwright", Station.example(Station.BOOST));
		station.build();
		IMarker marker = Station.only(file, "leg-near-saturation");
		assertEquals(IMarker.SEVERITY_WARNING, marker.getAttribute(IMarker.SEVERITY, -1));
		assertEquals("centre-leg", marker.getAttribute(FindingMarkers.SUBJECT, ""));
		assertEquals("full-load", marker.getAttribute(FindingMarkers.OPERATING_POINT, ""));
		assertEquals("centre-leg at full-load", marker.getAttribute(IMarker.LOCATION, ""));
		assertTrue(marker.getAttribute(IMarker.MESSAGE, "").startsWith("centre-leg at full-load: "));
		assertTrue(marker.isSubtypeOf(IMarker.PROBLEM), "shown in the Problems view");
	}

	@Test
	void aLegOverSaturationIsAnError() throws Exception {
		IFile file = station.write("reactor.gapwright", Station.example("three-phase-reactor.gapwright"));
		station.build();
		List<IMarker> over = Station.markers(file).stream()
				.filter(m -> m.getAttribute(FindingMarkers.CODE, "").equals("leg-over-saturation")).toList();
		assertFalse(over.isEmpty());
		over.forEach(m -> assertEquals(IMarker.SEVERITY_ERROR, m.getAttribute(IMarker.SEVERITY, -1)));
	}

	@Test
	void mendingTheDesignClearsItsMarkers() throws Exception {
		IFile file = station.write("choke.gapwright", Station.example(Station.BOOST));
		station.build();
		assertFalse(Station.markers(file).isEmpty());
		station.write("choke.gapwright", Station.calmBoost());
		station.build();
		assertEquals(List.of(), Station.messages(file));
	}

	@Test
	void aBareNumberIsMarkedAtItsLine() throws Exception {
		String text = Station.example(Station.BOOST).replaceFirst("depth=\"[^\"]*\"", "depth=\"12\"");
		int line = 1 + (int) text.substring(0, text.indexOf("depth=\"12\"")).chars().filter(c -> c == '\n').count();
		IFile file = station.write("choke.gapwright", text);
		station.build();
		IMarker marker = Station.only(file, "design-unreadable");
		assertEquals(line, marker.getAttribute(IMarker.LINE_NUMBER, 0));
		assertTrue(marker.getAttribute(IMarker.MESSAGE, "").contains("depth = '12'"), marker.getAttribute(IMarker.MESSAGE, ""));
		assertEquals(1, Station.markers(file).size());
	}

	@Test
	void aTruncatedFileIsMarkedAndAWholeOneClearsIt() throws Exception {
		String whole = Station.calmBoost();
		IFile file = station.write("choke.gapwright", whole.substring(0, whole.length() / 2));
		station.build();
		assertEquals("design-unreadable", Station.markers(file).get(0).getAttribute(FindingMarkers.CODE, ""));
		station.write("choke.gapwright", whole);
		station.build();
		assertEquals(List.of(), Station.messages(file));
	}

	@Test
	void aFileThatCannotBeOpenedIsMarkedInsteadOfBreakingTheBuild() throws Exception {
		IFile file = station.write("choke.gapwright", Station.calmBoost());
		Files.delete(file.getLocation().toPath());
		DesignFileCheck.check(file, null);
		assertEquals("design-unreadable", Station.markers(file).get(0).getAttribute(FindingMarkers.CODE, ""));
	}

	@Test
	void aDerivedCopyIsNotMarked() throws Exception {
		IFile file = station.write("choke.gapwright", Station.example(Station.BOOST));
		file.setDerived(true, null);
		station.build();
		assertEquals(List.of(), Station.messages(file));
	}

	@Test
	void aFileOfAnotherEndingIsNotMarked() throws Exception {
		IFile file = station.write("choke.xml", Station.example(Station.BOOST));
		station.build();
		assertEquals(List.of(), Station.messages(file));
	}

	@Test
	void markersGoAlongWithAMovedFile() throws Exception {
		IFile file = station.write("choke.gapwright", Station.example(Station.BOOST));
		station.build();
		List<String> before = Station.messages(file);
		IFile moved = station.project.getFile("renamed.gapwright");
		file.move(moved.getFullPath(), IResource.FORCE, null);
		station.build();
		assertFalse(before.isEmpty());
		assertEquals(before, Station.messages(station.project));
		assertEquals(before, Station.messages(moved));
	}

	@Test
	void aMarkerThatStillHoldsIsLeftAlone() throws Exception {
		IFile file = station.write("choke.gapwright", Station.example(Station.BOOST));
		station.build();
		long id = Station.only(file, "leg-near-saturation").getId();
		station.write("choke.gapwright", Station.example(Station.BOOST).replaceFirst("<gapwright:Design ", "<gapwright:Design notes=\"looked at\" ")
				.replaceFirst("(notes=\"looked at\"[^>]*) notes=\"[^\"]*\"", "$1"));
		station.build();
		assertEquals(id, Station.only(file, "leg-near-saturation").getId());
	}

	@Test
	void theContentTypeIsOurs() throws Exception {
		IFile file = station.write("choke.gapwright", Station.example(Station.BOOST));
		assertEquals(DesignFiles.CONTENT_TYPE, file.getContentDescription().getContentType().getId());
	}
}
