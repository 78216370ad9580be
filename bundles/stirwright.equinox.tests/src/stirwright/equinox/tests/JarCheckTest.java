package stirwright.equinox.tests;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.List;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.osgi.framework.Bundle;
import org.osgi.framework.BundleActivator;
import org.osgi.framework.BundleContext;
import stirwright.conformance.BundleReport;
import stirwright.conformance.Finding;
import stirwright.conformance.JarCheck;
import stirwright.conformance.JarRefusedException;
import stirwright.correlation.Contribution;
import stirwright.correlation.Correlation;

/** The suite over a jar: what it reports, what it refuses, and that it leaves nothing behind. */
class JarCheckTest {
    @TempDir
    Path folder;

    private List<String> before;

    @BeforeEach
    void lookAround() {
        before = bundles();
    }

    @AfterEach
    void nothingIsLeftBehind() {
        assertEquals(before, bundles());
    }

    @Test
    void aSoundJarPasses() throws Exception {
        BundleReport report = check(SampleJar.bytes());
        assertEquals(List.of(), report.findings());
        assertTrue(report.passed());
        assertEquals("invented.contract.sample 1.0.0", report.bundle());
        assertEquals(List.of("sampleblade"), report.families());
        assertEquals(16, report.correlations().size());
        assertEquals(19, report.rows());
        assertEquals(1, report.recalledRows());
        assertTrue(Framework.catalogue().family("sampleblade").isEmpty(), "the family stays in the library");
    }

    @Test
    void anUnsoundJarIsToldWhatToMend() throws Exception {
        BundleReport report = check(TinyBundle.named("wanderer.check").component(Wanderer.class).jar());
        assertFalse(report.passed());
        assertEquals(List.of("wanderer.np.invented"), report.correlations());
        assertEquals(List.of("bounds", "bounds", "bounds", "bounds", "rows cover"),
                report.findings().stream().map(Finding::check).toList(), () -> "found " + report.findings());
    }

    @Test
    void aContributionThatFailsIsAFinding() throws Exception {
        BundleReport report = check(TinyBundle.named("wanderer.refuser").component(Refuser.class).jar());
        assertTrue(report.findings().get(0).message().contains("not today"), () -> "found " + report.findings());
    }

    @Test
    void aComponentThatCannotBeCreatedIsAFinding() throws Exception {
        BundleReport report = check(TinyBundle.named("wanderer.hermit").component(Hermit.class).jar());
        assertTrue(report.findings().get(0).message().contains("constructor"), () -> "found " + report.findings());
    }

    @Test
    void whatIsNoBundleIsRefused() throws Exception {
        says(refused("no jar at all".getBytes()), "is not a jar");
        says(refused(new byte[0]), "is not a jar");
        says(refused(TinyBundle.named(" ").jar()), "not a bundle", "Bundle-SymbolicName");
        says(refused(TinyBundle.named("wanderer.part").header("Fragment-Host", "stirwright.core").jar()), "fragment");
        assertThrows(NoSuchFileException.class, () -> JarCheck.check(Framework.context(), folder.resolve("nothing.jar")));
    }

    @Test
    void aMissingRequirementIsNamed() throws Exception {
        says(refused(TinyBundle.named("wanderer.needy").header("Import-Package", "nowhere.to.be.found").jar()),
                "nothing that is installed provides", "nowhere.to.be.found");
    }

    @Test
    void aBundleThatFailsToStartIsRefused() throws Exception {
        says(refused(TinyBundle.named("wanderer.stubborn").holding(Stubborn.class)
                .header("Bundle-Activator", Stubborn.class.getName()).jar()), "cannot be started", "I will not");
    }

    @Test
    void aBundleThatPublishesNothingIsRefused() throws Exception {
        says(refused(TinyBundle.named("wanderer.silent").holding(Wanderer.class).jar()),
                "wanderer.silent 1.0.0", "published no service", "Service-Component");
    }

    @Test
    void aNameThatIsInstalledIsRefused() throws Exception {
        Bundle installed = Framework.install("twin", TinyBundle.named("wanderer.twin").component(Wanderer.class).jar());
        try {
            says(refused(TinyBundle.named("wanderer.twin").component(Wanderer.class).jar()),
                    "wanderer.twin 1.0.0", "installed already", "test:twin");
        } finally {
            installed.uninstall();
        }
    }

    @Test
    void whatAnInterruptedRunLeftIsReplaced() throws Exception {
        Path jar = write(SampleJar.bytes());
        Framework.context().installBundle("stirwright-check:" + jar, Files.newInputStream(jar));
        assertTrue(JarCheck.check(Framework.context(), jar).passed());
    }

    /** Its component cannot be created. */
    public static final class Hermit implements Contribution {
        public Hermit() {
            throw new IllegalStateException("leave me alone");
        }

        @Override
        public List<Correlation> correlations() {
            return List.of();
        }
    }

    /** Its bundle cannot be started. */
    public static final class Stubborn implements BundleActivator {
        @Override
        public void start(BundleContext context) {
            throw new IllegalStateException("I will not");
        }

        @Override
        public void stop(BundleContext context) {
            // Never started.
        }
    }

    private BundleReport check(byte[] jar) throws IOException, JarRefusedException {
        return JarCheck.check(Framework.context(), write(jar));
    }

    private String refused(byte[] jar) {
        return assertThrows(JarRefusedException.class, () -> check(jar)).getMessage();
    }

    private Path write(byte[] jar) throws IOException {
        return Files.write(folder.resolve("checked.jar"), jar).toAbsolutePath();
    }

    private static void says(String message, String... words) {
        for (String word : words) {
            assertTrue(message.contains(word), () -> "no '" + word + "' in: " + message);
        }
    }

    private static List<String> bundles() {
        return Arrays.stream(Framework.context().getBundles()).map(Bundle::getLocation).toList();
    }
}
