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
import stirwright.conformance.BundleReport;
import stirwright.conformance.InstalledBundles;
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
        PrintWriter out = writer(FileDescriptor.out, "stdout.encoding");
        PrintWriter err = writer(FileDescriptor.err, "stderr.encoding");
        try {
            Library library = service(bundles, Library.class);
            DropIns door = service(bundles, DropIns.class);
            if (library == null || door == null) {
                err.println("Stirwright's core did not start: the installation is incomplete; unpack it again.");
                return ExitCode.UNUSABLE;
            }
            Desk desk = new Desk(library::catalogue, jar -> JarCheck.check(bundles, jar),
                    () -> BundleReport.ofInstalled(bundles), () -> InstalledBundles.proofs(bundles), door, out, err,
                    release(bundles.getBundle().getVersion()));
            return Commands.run(desk, arguments);
        } finally {
            // Not closed: whatever goes wrong later is told on the same descriptor.
            out.flush();
            err.flush();
        }
    }

    /** Null when there is none, also when it is registered but does not come up. */
    private static <S> S service(BundleContext bundles, Class<S> type) {
        ServiceReference<S> reference = bundles.getServiceReference(type);
        return reference == null ? null : bundles.getService(reference);
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
