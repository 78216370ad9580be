package stirwright.equinox.tests;

import java.io.StringWriter;
import java.net.URI;
import java.net.URL;
import java.net.URLClassLoader;
import java.nio.file.Path;
import java.util.List;
import javax.tools.JavaCompiler;
import javax.tools.JavaFileObject;
import javax.tools.SimpleJavaFileObject;
import javax.tools.ToolProvider;
import stirwright.core.Arrival;
import stirwright.correlation.Contribution;

/** Compiles a contribution as a contributor would: against the contract, and nothing else of ours. */
final class Compiled {

    /** DS reads the annotation when a bundle is built; for the compiler it need do no more than be there. */
    private static final Source ANNOTATION = new Source("org.osgi.service.component.annotations.Component",
            "package org.osgi.service.component.annotations;\npublic @interface Component {}\n");

    private Compiled() {}

    /**
     * What a class contributes.
     *
     * @param folder for the classes
     */
    static Arrival arrival(String name, String text, Path folder, String origin) throws Exception {
        Path contract = SourceTree.root().resolve("bundles/stirwright.correlation/target/classes");
        JavaCompiler compiler = ToolProvider.getSystemJavaCompiler();
        StringWriter complaints = new StringWriter();
        boolean done = compiler.getTask(complaints, null, null,
                List.of("-proc:none", "-classpath", contract.toString(), "-d", folder.toString()), null,
                List.of(ANNOTATION, new Source(name, text))).call();
        if (!done) {
            throw new AssertionError("does not compile:\n" + complaints);
        }
        try (URLClassLoader loader = new URLClassLoader(
                new URL[] {folder.toUri().toURL()}, Compiled.class.getClassLoader())) {
            return Arrival.of((Contribution) loader.loadClass(name).getConstructor().newInstance(), origin);
        }
    }

    private static final class Source extends SimpleJavaFileObject {
        private final String text;

        Source(String name, String text) {
            super(URI.create("string:///" + name.replace('.', '/') + Kind.SOURCE.extension), Kind.SOURCE);
            this.text = text;
        }

        @Override
        public CharSequence getCharContent(boolean ignoreEncodingErrors) {
            return text;
        }
    }
}
