package gapwright.generator;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;

import org.eclipse.emf.codegen.ecore.generator.Generator;
import org.eclipse.emf.codegen.ecore.genmodel.GenModel;
import org.eclipse.emf.codegen.ecore.genmodel.GenModelPackage;
import org.eclipse.emf.codegen.ecore.genmodel.generator.GenBaseGeneratorAdapter;
import org.eclipse.emf.codegen.ecore.genmodel.generator.GenModelGeneratorAdapterFactory;
import org.eclipse.emf.common.util.BasicMonitor;
import org.eclipse.emf.common.util.Diagnostic;
import org.eclipse.emf.common.util.URI;
import org.eclipse.emf.ecore.plugin.EcorePlugin;
import org.eclipse.emf.ecore.resource.ResourceSet;
import org.eclipse.emf.ecore.resource.impl.ResourceSetImpl;
import org.eclipse.emf.ecore.xmi.impl.EcoreResourceFactoryImpl;
import org.eclipse.emf.ecore.xmi.impl.XMIResourceFactoryImpl;

/**
 * Runs EMF's generator on {@code bundles/gapwright.model/model} outside Eclipse, into a scratch folder.
 * Only what it finds under {@link #GENERATED} there belongs into the repository.
 */
final class ModelGenerator {

	/** Generated folders and files, relative to the folder that holds the bundles. */
	static final List<String> GENERATED = List.of("gapwright.model/src-gen", "gapwright.model.edit/src-gen",
			"gapwright.model.edit/plugin.properties");

	private ModelGenerator() {
	}

	/**
	 * @param modelFolder folder with {@code gapwright.ecore} and {@code gapwright.genmodel}
	 * @param scratch     empty folder; receives {@code gapwright.model} and {@code gapwright.model.edit}
	 */
	static void generate(Path modelFolder, Path scratch) throws IOException {
		Path modelProject = Files.createDirectories(scratch.resolve("gapwright.model"));
		Path editProject = Files.createDirectories(scratch.resolve("gapwright.model.edit"));
		map("gapwright.model", modelProject);
		map("gapwright.model.edit", editProject);

		ResourceSet resources = new ResourceSetImpl();
		var factories = resources.getResourceFactoryRegistry().getExtensionToFactoryMap();
		factories.put("ecore", new EcoreResourceFactoryImpl());
		factories.put("genmodel", new XMIResourceFactoryImpl());
		GenModelPackage.eINSTANCE.eClass();
		URI genmodel = URI.createFileURI(modelFolder.resolve("gapwright.genmodel").toAbsolutePath().toString());
		GenModel genModel = (GenModel) resources.getResource(genmodel, true).getContents().get(0);
		genModel.reconcile();
		genModel.setCanGenerate(true);
		Diagnostic problems = genModel.diagnose();
		if (problems.getSeverity() == Diagnostic.ERROR) {
			throw new IllegalStateException("gapwright.genmodel: " + problems.getChildren());
		}

		Generator generator = new Generator();
		generator.getAdapterFactoryDescriptorRegistry().addDescriptor(GenModelPackage.eNS_URI,
				GenModelGeneratorAdapterFactory.DESCRIPTOR);
		generator.setInput(genModel);
		run(generator, genModel, GenBaseGeneratorAdapter.MODEL_PROJECT_TYPE);
		run(generator, genModel, GenBaseGeneratorAdapter.EDIT_PROJECT_TYPE);
		dropBundleNames(editProject.resolve("plugin.properties"));
	}

	/** The generator's placeholder names; the manifest says the real ones. */
	private static void dropBundleNames(Path properties) throws IOException {
		List<String> kept = Files.readAllLines(properties).stream()
				.filter(line -> !line.startsWith("pluginName") && !line.startsWith("providerName")).toList();
		Files.write(properties, kept);
	}

	private static void run(Generator generator, GenModel genModel, String projectType) {
		Diagnostic result = generator.generate(genModel, projectType, new BasicMonitor());
		if (result.getSeverity() == Diagnostic.ERROR) {
			throw new IllegalStateException(projectType + ": " + result.getChildren());
		}
	}

	private static void map(String project, Path folder) {
		EcorePlugin.getPlatformResourceMap().put(project, URI.createFileURI(folder.toAbsolutePath() + "/"));
	}
}
