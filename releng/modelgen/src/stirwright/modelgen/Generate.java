package stirwright.modelgen;

import java.io.File;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Comparator;
import java.util.List;
import java.util.stream.Stream;
import org.eclipse.emf.codegen.ecore.generator.Generator;
import org.eclipse.emf.codegen.ecore.generator.GeneratorAdapterFactory;
import org.eclipse.emf.codegen.ecore.genmodel.GenModel;
import org.eclipse.emf.codegen.ecore.genmodel.GenModelPackage;
import org.eclipse.emf.codegen.ecore.genmodel.GenPackage;
import org.eclipse.emf.codegen.ecore.genmodel.generator.GenBaseGeneratorAdapter;
import org.eclipse.emf.codegen.ecore.genmodel.generator.GenModelGeneratorAdapterFactory;
import org.eclipse.emf.common.util.BasicMonitor;
import org.eclipse.emf.common.util.Diagnostic;
import org.eclipse.emf.common.util.URI;
import org.eclipse.emf.ecore.plugin.EcorePlugin;
import org.eclipse.emf.ecore.resource.ResourceSet;
import org.eclipse.emf.ecore.resource.impl.ResourceSetImpl;
import org.eclipse.emf.ecore.xmi.impl.EcoreResourceFactoryImpl;

/** Writes the Java sources of a bundle's model into its folder {@code src-gen}, in place of what stood there. */
public final class Generate {
    private static final String OUTPUT = "src-gen";

    private Generate() {}

    /**
     * @param arguments the bundle's folder, its generator model as seen from there, and a folder for what the generator
     *     writes besides sources and nobody needs
     */
    public static void main(String[] arguments) throws IOException {
        Path bundle = Path.of(arguments[0]).toRealPath();
        String name = bundle.getFileName().toString();
        Path scratch = Path.of(arguments[2]).resolve(name);
        delete(scratch);
        GenModel model = load(bundle.resolve(arguments[1]));
        EcorePlugin.getPlatformResourceMap().put(name, URI.createFileURI(scratch + File.separator));
        model.setModelDirectory("/" + name + "/" + OUTPUT);
        model.setCanGenerate(true);
        require(model.diagnose());
        GeneratorAdapterFactory.Descriptor.Registry.INSTANCE.addDescriptor(
                GenModelPackage.eNS_URI, GenModelGeneratorAdapterFactory.DESCRIPTOR);
        Generator generator = new Generator();
        generator.setInput(model);
        for (GenPackage part : model.getGenPackages()) {
            require(generator.generate(part, GenBaseGeneratorAdapter.MODEL_PROJECT_TYPE, new BasicMonitor()));
        }
        delete(bundle.resolve(OUTPUT));
        Files.move(scratch.resolve(OUTPUT), bundle.resolve(OUTPUT));
    }

    private static GenModel load(Path file) {
        GenModelPackage.eINSTANCE.eClass();
        ResourceSet resources = new ResourceSetImpl();
        resources.getResourceFactoryRegistry().getExtensionToFactoryMap().put("*", new EcoreResourceFactoryImpl());
        GenModel model = (GenModel) resources.getResource(URI.createFileURI(file.toString()), true).getContents().get(0);
        model.reconcile();
        return model;
    }

    private static void delete(Path folder) throws IOException {
        if (Files.exists(folder)) {
            try (Stream<Path> inside = Files.walk(folder)) {
                for (Path path : inside.sorted(Comparator.reverseOrder()).toList()) {
                    Files.delete(path);
                }
            }
        }
    }

    /** Fails the build, since what the generator could not do would show later as a strange compiler message. */
    private static void require(Diagnostic outcome) {
        if (outcome.getSeverity() >= Diagnostic.ERROR) {
            throw new IllegalStateException(outcome.getMessage() + ": " + outcome.getChildren());
        }
    }

    private static void require(List<String> problems) {
        if (!problems.isEmpty()) {
            throw new IllegalStateException(String.join("; ", problems));
        }
    }
}
