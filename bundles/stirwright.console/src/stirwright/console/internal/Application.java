package stirwright.console.internal;

import java.io.FileDescriptor;
import java.io.FileOutputStream;
import java.io.OutputStreamWriter;
import java.io.PrintWriter;
import java.nio.charset.Charset;
import org.eclipse.equinox.app.IApplication;
import org.eclipse.equinox.app.IApplicationContext;
import org.osgi.framework.BundleContext;
import org.osgi.framework.FrameworkUtil;
import org.osgi.framework.ServiceReference;
import org.osgi.framework.Version;
import stirwright.conformance.JarCheck;
import stirwright.core.Library;
import stirwright.trust.DropIns;

/** Where Equinox hands over: finds the library service and runs one command. */
public final class Application implements IApplication {

    private static final String[] NO_ARGUMENTS = {};

    @Override
    public Object start(IApplicationContext context) {
        Object given = context.getArguments().get(IApplicationContext.APPLICATION_ARGS);
        String[] arguments = given instanceof String[] strings ? strings : NO_ARGUMENTS;
        BundleContext bundles = FrameworkUtil.getBundle(Application.class).getBundleContext();
        try (PrintWriter out = writer(FileDescriptor.out, "stdout.encoding");
                PrintWriter err = writer(FileDescriptor.err, "stderr.encoding")) {
            ServiceReference<Library> reference = bundles.getServiceReference(Library.class);
            ServiceReference<DropIns> door = bundles.getServiceReference(DropIns.class);
            if (reference == null || door == null) {
                err.println("Stirwright's core did not start: the installation is incomplete; unpack it again.");
                return ExitCode.UNUSABLE;
            }
            Library library = bundles.getService(reference);
            Desk desk = new Desk(library::catalogue, jar -> JarCheck.check(bundles, jar), bundles.getService(door), out,
                    err, release(bundles.getBundle().getVersion()));
            return Commands.run(desk, arguments);
        }
    }

    private static PrintWriter writer(FileDescriptor stream, String encodingProperty) {
        Charset charset = Charset.forName(System.getProperty(encodingProperty, Charset.defaultCharset().name()));
        return new PrintWriter(new OutputStreamWriter(new FileOutputStream(stream), charset), false);
    }

    private static String release(Version version) {
        return version.getMajor() + "." + version.getMinor() + "." + version.getMicro();
    }

    @Override
    public void stop() {
        // A command holds nothing that has to be released.
    }
}
