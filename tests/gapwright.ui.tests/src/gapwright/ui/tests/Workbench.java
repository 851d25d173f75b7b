package gapwright.ui.tests;

import java.io.ByteArrayInputStream;
import java.io.InputStream;
import java.util.ArrayList;
import java.util.List;
import java.util.function.BooleanSupplier;
import java.util.function.Predicate;

import org.eclipse.core.resources.IFile;
import org.eclipse.core.resources.IProject;
import org.eclipse.core.resources.ResourcesPlugin;
import org.eclipse.core.runtime.CoreException;
import org.eclipse.core.runtime.NullProgressMonitor;
import org.eclipse.swt.SWT;
import org.eclipse.swt.graphics.Point;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Control;
import org.eclipse.swt.widgets.Display;
import org.eclipse.swt.widgets.Shell;
import org.eclipse.ui.IViewPart;
import org.eclipse.ui.IWorkbenchPage;
import org.eclipse.ui.PartInitException;
import org.eclipse.ui.PlatformUI;
import org.eclipse.ui.WorkbenchException;
import org.eclipse.ui.ide.IDE;

import gapwright.library.Example;
import gapwright.library.Examples;
import gapwright.ui.editor.DesignEditor;

/** A window of the workbench for a journey: a project, editors, real keys and mouse buttons. */
final class Workbench {

	/** Long enough for any machine; reached only when something is broken. */
	private static final long PATIENCE = 20_000;

	private Workbench() {
	}

	static IWorkbenchPage page() {
		return PlatformUI.getWorkbench().getActiveWorkbenchWindow().getActivePage();
	}

	static Shell shell() {
		return page().getWorkbenchWindow().getShell();
	}

	/** Our perspective as it comes, in a window of a decent size, in front. */
	static void start() throws WorkbenchException {
		LoggedErrors.forget();
		IWorkbenchPage page = PlatformUI.getWorkbench().showPerspective("gapwright.ui.perspective", PlatformUI.getWorkbench().getActiveWorkbenchWindow());
		if (page.findView("org.eclipse.ui.internal.introview") != null) {
			page.hideView(page.findView("org.eclipse.ui.internal.introview"));
		}
		page.resetPerspective();
		shell().setMaximized(true);
		shell().forceActive();
		settle();
	}

	static IProject project() throws CoreException {
		IProject project = ResourcesPlugin.getWorkspace().getRoot().getProject("pump-station");
		if (!project.exists()) {
			project.create(new NullProgressMonitor());
		}
		project.open(new NullProgressMonitor());
		return project;
	}

	/** A fresh copy of an example in the project. */
	static IFile example(String fileName) throws CoreException {
		Example example = Examples.all().stream().filter(each -> each.fileName().equals(fileName)).findFirst().orElseThrow();
		return file(fileName, example.open());
	}

	static IFile file(String name, byte[] content) throws CoreException {
		return file(name, new ByteArrayInputStream(content));
	}

	private static IFile file(String name, InputStream content) throws CoreException {
		IFile file = project().getFile(name);
		if (file.exists()) {
			file.setContents(content, true, false, new NullProgressMonitor());
		} else {
			file.create(content, true, new NullProgressMonitor());
		}
		return file;
	}

	static DesignEditor open(IFile file) throws PartInitException {
		DesignEditor editor = (DesignEditor) IDE.openEditor(page(), file, DesignEditor.ID, true);
		settle();
		return editor;
	}

	static <V extends IViewPart> V view(String id, Class<V> type) throws PartInitException {
		V view = type.cast(page().showView(id));
		settle();
		return view;
	}

	/** Closes all editors without saving; fails when an exception went to the log since {@link #start}. */
	static void closeAll() {
		page().closeAllEditors(false);
		settle();
		LoggedErrors.assertNone();
	}

	/** Works off all events that are waiting. */
	static void settle() {
		Display display = Display.getCurrent();
		for (int k = 0; k < 5; k++) {
			while (display.readAndDispatch()) {
				// as long as there are any
			}
			display.update();
		}
	}

	/** Works off events until something is so. */
	static void await(String what, BooleanSupplier condition) {
		long end = System.currentTimeMillis() + PATIENCE;
		Display display = Display.getCurrent();
		while (!condition.getAsBoolean()) {
			if (System.currentTimeMillis() > end) {
				throw new AssertionError("waited in vain for: " + what);
			}
			if (!display.readAndDispatch()) {
				Thread.onSpinWait();
			}
		}
		settle();
	}

	/** Gives a control the keyboard and waits until it has it. */
	static void focus(Control control) {
		control.getShell().forceActive();
		await("focus on " + control, () -> control.isFocusControl() || control.forceFocus() && control.isFocusControl());
	}

	/** Types characters as a keyboard would. */
	static void type(String text) {
		List<String> command = new ArrayList<>(List.of("key"));
		text.chars().forEach(c -> command.add(keyName(c)));
		RealEvents.send(command.toArray(String[]::new));
	}

	/** Presses and releases a key. Pass a character, or a key code of SWT. */
	static void key(int code, int modifier) {
		String held = (modifier & SWT.MOD1) != 0 ? "ctrl+" : (modifier & SWT.ALT) != 0 ? "alt+" : "";
		// an upper case letter already holds Shift
		String shift = (modifier & SWT.SHIFT) != 0 && (code & SWT.KEYCODE_BIT) != 0 ? "shift+" : "";
		RealEvents.send("key", held + shift + keyName(code));
	}

	private static String keyName(int code) {
		return switch (code) {
		case SWT.ESC -> "Escape";
		case SWT.CR -> "Return";
		case SWT.DEL -> "Delete";
		case SWT.TAB -> "Tab";
		case SWT.BS -> "BackSpace";
		case SWT.F2 -> "F2";
		case SWT.HOME -> "Home";
		case SWT.END -> "End";
		case SWT.ARROW_LEFT -> "Left";
		case SWT.ARROW_RIGHT -> "Right";
		case SWT.ARROW_UP -> "Up";
		case SWT.ARROW_DOWN -> "Down";
		case ' ' -> "space";
		case '.' -> "period";
		case ',' -> "comma";
		case '-' -> "minus";
		case '+' -> "plus";
		default -> {
			if (!Character.isLetterOrDigit(code)) {
				throw new IllegalArgumentException("no name for the key " + code);
			}
			yield Character.toString(code);
		}
		};
	}

	/** Presses and releases the left button over a place of a control. */
	static void click(Control control, int x, int y) {
		Point place = control.toDisplay(x, y);
		RealEvents.send("mousemove", Integer.toString(place.x), Integer.toString(place.y));
		RealEvents.send("click", "1");
	}

	/** Posted events come back through the X server, and windows are painted by a clock: the queue may be empty while they are on their way. */
	static void drain() {
		drain(60);
	}

	/** @param quiet how long nothing may have happened, ms */
	static void drain(long quiet) {
		Display display = Display.getCurrent();
		long end = System.currentTimeMillis() + quiet;
		long atMost = System.currentTimeMillis() + PATIENCE;
		while (System.currentTimeMillis() < Math.min(end, atMost)) {
			if (display.readAndDispatch()) {
				end = System.currentTimeMillis() + quiet;
			}
		}
	}

	/** The first visible control of a kind below another for which something holds. */
	static <C extends Control> C find(Composite below, Class<C> type, Predicate<C> wanted) {
		C found = search(below, type, wanted);
		if (found == null) {
			throw new AssertionError("no such " + type.getSimpleName());
		}
		return found;
	}

	private static <C extends Control> C search(Composite below, Class<C> type, Predicate<C> wanted) {
		for (Control child : below.getChildren()) {
			if (type.isInstance(child) && child.isVisible() && wanted.test(type.cast(child))) {
				return type.cast(child);
			}
			C deeper = child instanceof Composite composite ? search(composite, type, wanted) : null;
			if (deeper != null) {
				return deeper;
			}
		}
		return null;
	}
}
