package gapwright.workspace.tests;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;

import org.eclipse.core.resources.IFile;
import org.eclipse.core.runtime.CoreException;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;

import gapwright.workspace.DesignNature;

/** Switching the checks on and off for a project. */
class NatureTest {

	private Station station;

	@BeforeEach
	void open() throws CoreException {
		station = new Station("nature");
	}

	@AfterEach
	void close() throws CoreException {
		station.delete();
	}

	@Test
	void switchingOnTwiceBuildsOnce() throws Exception {
		DesignNature.addTo(station.project, null);
		assertTrue(DesignNature.isOn(station.project));
		assertArrayEquals(new String[] { DesignNature.ID }, station.project.getDescription().getNatureIds());
		assertEquals(1, station.project.getDescription().getBuildSpec().length);
	}

	@Test
	void switchingOffTakesTheMarkersAndTheBuilderAlong() throws Exception {
		IFile file = station.write("choke.gapwright", Station.example(Station.BOOST));
		station.build();
		assertFalse(Station.markers(file).isEmpty());
		DesignNature.removeFrom(station.project, null);
		assertFalse(DesignNature.isOn(station.project));
		assertEquals(0, station.project.getDescription().getBuildSpec().length);
		assertEquals(List.of(), Station.messages(file));
	}

	@Test
	void aClosedProjectIsNotOn() throws Exception {
		station.project.close(null);
		assertFalse(DesignNature.isOn(station.project));
		station.project.open(null);
		assertTrue(DesignNature.isOn(station.project));
	}
}
