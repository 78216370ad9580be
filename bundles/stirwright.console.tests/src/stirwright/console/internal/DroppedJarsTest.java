package stirwright.console.internal;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.lang.reflect.Proxy;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.osgi.framework.Bundle;

class DroppedJarsTest {

    @TempDir
    private Path folder;

    private static Bundle bundle(Path jar, int state) {
        return (Bundle) Proxy.newProxyInstance(Bundle.class.getClassLoader(), new Class<?>[] {Bundle.class},
                (proxy, method, arguments) -> switch (method.getName()) {
                    case "getLocation" -> "file:" + jar;
                    case "getState" -> state;
                    default -> throw new AssertionError(method);
                });
    }

    @Test
    void namesTheJarsThatDidNotBecomeRunningBundles() throws IOException {
        Path good = Files.createFile(folder.resolve("good.jar"));
        Path waiting = Files.createFile(folder.resolve("waiting.jar"));
        Files.createFile(folder.resolve("corrupt.jar"));
        Files.createFile(folder.resolve("README.txt"));
        Bundle[] installed = {bundle(good, Bundle.ACTIVE), bundle(waiting, Bundle.INSTALLED)};
        List<String> problems = DroppedJars.unusable(installed, folder.toString()).stream().sorted().toList();
        assertEquals(2, problems.size(), problems.toString());
        assertTrue(problems.get(0).contains("corrupt.jar: is not a bundle"), problems.get(0));
        assertTrue(problems.get(1).contains("waiting.jar: cannot be started"), problems.get(1));
    }

    @Test
    void noFolderIsNoProblem() {
        assertEquals(List.of(), DroppedJars.unusable(new Bundle[0], null));
        assertEquals(List.of(), DroppedJars.unusable(new Bundle[0], folder.resolve("none").toString()));
    }
}
