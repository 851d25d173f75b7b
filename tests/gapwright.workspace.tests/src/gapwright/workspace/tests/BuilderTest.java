package gapwright.workspace.tests;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;

import org.eclipse.core.resources.IFile;
import org.eclipse.core.resources.IncrementalProjectBuilder;
import org.eclipse.core.runtime.CoreException;
import org.eclipse.core.runtime.NullProgressMonitor;
import org.eclipse.core.runtime.OperationCanceledException;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;

import gapwright.workspace.FindingMarkers;

/** Which designs a build looks at, and that it can be watched and stopped. */
class BuilderTest {

	private Station station;

	@BeforeEach
	void open() throws CoreException {
		station = new Station("builder");
	}

	@AfterEach
	void close() throws CoreException {
		station.delete();
	}

	@Test
	void anIncrementalBuildChecksOnlyWhatChanged() throws Exception {
		IFile untouched = station.write("untouched.gapwright", Station.calmBoost());
		IFile changed = station.write("changed.gapwright", Station.calmBoost());
		station.build();
		untouched.createMarker(FindingMarkers.TYPE);
		changed.createMarker(FindingMarkers.TYPE);
		station.write("changed.gapwright", Station.example(Station.BOOST));
		station.build();
		assertEquals(1, Station.markers(untouched).size(), "an unchanged design was checked again");
		Station.only(changed, "leg-near-saturation");
		assertEquals(1, Station.markers(changed).size());
	}

	@Test
	void aFullBuildChecksEverything() throws Exception {
		IFile file = station.write("choke.gapwright", Station.calmBoost());
		station.build();
		file.createMarker(FindingMarkers.TYPE);
		station.project.build(IncrementalProjectBuilder.FULL_BUILD, null);
		assertEquals(List.of(), Station.messages(file));
	}

	@Test
	void cleaningRemovesTheMarkersAndTheNextBuildBringsThemBack() throws Exception {
		IFile file = station.write("choke.gapwright", Station.example(Station.BOOST));
		station.build();
		List<String> before = Station.messages(file);
		station.project.build(IncrementalProjectBuilder.CLEAN_BUILD, null);
		assertEquals(List.of(), Station.messages(file));
		station.build();
		assertFalse(before.isEmpty());
		assertEquals(before, Station.messages(file));
	}

	@Test
	void designsInFoldersAreCheckedToo() throws Exception {
		station.project.getFolder("pumps").create(true, true, null);
		IFile file = station.write("pumps/choke.gapwright", Station.example(Station.BOOST));
		station.build();
		Station.only(file, "leg-near-saturation");
	}

	@Test
	void progressNamesEachDesign() throws Exception {
		station.write("one.gapwright", Station.calmBoost());
		station.write("two.gapwright", Station.calmBoost());
		List<String> tasks = new ArrayList<>();
		station.project.build(IncrementalProjectBuilder.FULL_BUILD, new NullProgressMonitor() {
			@Override
			public void subTask(String name) {
				tasks.add(name);
			}
		});
		assertTrue(tasks.stream().anyMatch(t -> t.contains("builder/one.gapwright")), tasks.toString());
		assertTrue(tasks.stream().anyMatch(t -> t.contains("builder/two.gapwright")), tasks.toString());
	}

	@Test
	void aCancelledBuildLosesNoDesign() throws Exception {
		IFile first = station.write("one.gapwright", Station.example(Station.BOOST));
		IFile second = station.write("two.gapwright", Station.example(Station.BOOST));
		NullProgressMonitor stopsAfterTheFirst = new NullProgressMonitor() {
			private int checked;

			@Override
			public void subTask(String name) {
				if (name.contains(".gapwright") && ++checked == 2) {
					setCanceled(true);
				}
			}
		};
		assertThrows(OperationCanceledException.class,
				() -> station.project.build(IncrementalProjectBuilder.INCREMENTAL_BUILD, stopsAfterTheFirst));
		assertEquals(1, Station.markers(first).size() + Station.markers(second).size(), "one was checked, the other not");
		station.build();
		Station.only(first, "leg-near-saturation");
		Station.only(second, "leg-near-saturation");
	}
}
