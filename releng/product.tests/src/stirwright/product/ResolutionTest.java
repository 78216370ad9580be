package stirwright.product;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.ServiceLoader;
import java.util.concurrent.TimeUnit;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import org.osgi.framework.Bundle;
import org.osgi.framework.BundleException;
import org.osgi.framework.launch.Framework;
import org.osgi.framework.launch.FrameworkFactory;
import org.osgi.framework.wiring.BundleWiring;
import org.osgi.framework.wiring.FrameworkWiring;

/** A real framework that takes itself for the archive's platform resolves the archive's bundles. */
class ResolutionTest {
    private static final String DRAWING = "org.eclipse.swt.";

    @TempDir
    private Path folder;

    @ParameterizedTest
    @EnumSource
    void everyBundleResolvesOnItsPlatform(Platform platform) throws Exception {
        List<Bundle> installed = new ArrayList<>();
        Framework framework = resolve(platform, platform, installed);
        try {
            assertEquals(List.of(), names(installed, false));
            List<Bundle> drawing = installed.stream()
                    .filter(bundle -> bundle.getHeaders("").get("Fragment-Host") != null)
                    .filter(bundle -> bundle.getSymbolicName().startsWith(DRAWING))
                    .filter(bundle -> bundle.getHeaders("").get("Eclipse-PlatformFilter") != null).toList();
            assertEquals(List.of(platform.fragment()), drawing.stream().map(Bundle::getSymbolicName).toList());
            assertEquals("org.eclipse.swt", drawing.get(0).adapt(BundleWiring.class).getRequiredWires("osgi.wiring.host")
                    .get(0).getProvider().getSymbolicName());
        } finally {
            stop(framework);
        }
    }

    @Test
    void theFrameworkTellsPlatformsApart() throws Exception {
        List<Bundle> installed = new ArrayList<>();
        Framework framework = resolve(Platform.MACOS_AARCH64, Platform.MACOS_X86_64, installed);
        try {
            List<String> unresolved = names(installed, false);
            assertTrue(unresolved.contains(Platform.MACOS_AARCH64.fragment()), unresolved::toString);
        } finally {
            stop(framework);
        }
    }

    private Framework resolve(Platform archive, Platform pretended, List<Bundle> installed) throws Exception {
        Path home = archive.unpack(folder.resolve("unpacked"));
        Map<String, String> properties = new HashMap<>(pretended.frameworkProperties());
        properties.put("org.osgi.framework.storage", folder.resolve("storage").toString());
        Framework framework = ServiceLoader.load(FrameworkFactory.class).findFirst().orElseThrow().newFramework(properties);
        framework.init();
        for (String jar : ContentsTest.bundles(home)) {
            if (!jar.startsWith("plugins/org.eclipse.osgi_")) {
                installed.add(framework.getBundleContext().installBundle("reference:" + home.resolve(jar).toUri()));
            }
        }
        framework.adapt(FrameworkWiring.class).resolveBundles(installed);
        return framework;
    }

    private static void stop(Framework framework) throws BundleException, InterruptedException {
        framework.stop();
        framework.waitForStop(TimeUnit.SECONDS.toMillis(20));
    }

    private static List<String> names(List<Bundle> bundles, boolean resolved) {
        return bundles.stream().filter(bundle -> bundle.getState() >= Bundle.RESOLVED == resolved)
                .map(Bundle::getSymbolicName).toList();
    }
}
