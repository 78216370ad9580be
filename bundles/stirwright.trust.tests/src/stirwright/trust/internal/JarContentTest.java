package stirwright.trust.internal;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotNull;
import static org.junit.jupiter.api.Assertions.assertNull;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Arrays;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** What is read of a file, and what is refused. */
class JarContentTest {
    /** FIPS 180-2, appendix B.1: SHA-256 of "abc". */
    private static final String ABC = "ba7816bf8f01cfea414140de5dae2223b00361a396177a9cb410ff61f20015ad";

    @TempDir
    private Path folder;

    private JarContent read(byte[] content) throws IOException {
        return JarContent.read(Files.write(folder.resolve("some.jar"), content));
    }

    private void refused(String words, byte[] content) throws IOException {
        JarContent read = read(content);
        assertTrue(read.refusal().contains(words), "'" + read.refusal() + "' for " + words);
        assertEquals("", read.name());
    }

    @Test
    void hashNameAndVersionComeFromTheSameBytes() throws IOException {
        byte[] jar = Jars.bundle("Bundle-SymbolicName: a.b; singleton:=true", "Bundle-Version: 1.2.3.x");
        JarContent read = read(jar);
        assertEquals("", read.refusal());
        assertEquals("a.b", read.name());
        assertEquals("1.2.3.x", read.version());
        assertArrayEquals(jar, read.bytes());
        assertEquals(Sha256.of(jar), read.sha256());
        assertNull(read.withoutBytes().bytes());
    }

    @Test
    void theHashIsSha256() throws IOException {
        assertEquals(ABC, Sha256.of("abc".getBytes()));
        assertEquals(ABC, read("abc".getBytes()).sha256());
        assertEquals(ABC, Sha256.checked(ABC.toUpperCase()));
        for (String other : new String[] {"", "abc", ABC.substring(1), ABC + "0", ABC.replace('b', 'g')}) {
            assertThrows(IllegalArgumentException.class, () -> Sha256.checked(other));
        }
    }

    @Test
    void withoutAVersionItIsZero() throws IOException {
        assertEquals("0.0.0", read(Jars.bundle("Bundle-SymbolicName: a")).version());
    }

    @Test
    void theManifestNeedNotBeFirst() throws IOException {
        assertEquals("a", read(Jars.zip("x", "y", "META-INF/MANIFEST.MF",
                "Manifest-Version: 1.0\nBundle-SymbolicName: a\n")).name());
    }

    @Test
    void whatIsNoBundleIsRefused() throws IOException {
        refused("is not a jar", "no jar at all".getBytes());
        refused("is not a jar", new byte[0]);
        refused("has no META-INF/MANIFEST.MF", Jars.zip("x", "y"));
        refused("no Bundle-SymbolicName", Jars.bundle("Bundle-Version: 1.0.0"));
        refused("no Bundle-SymbolicName", Jars.bundle("Bundle-SymbolicName: ;singleton:=true"));
        for (String nameless : new String[] {";", ";;", " ; "}) {
            refused("no Bundle-SymbolicName", Jars.bundle("Bundle-SymbolicName: " + nameless));
        }
        refused("other characters", Jars.bundle("Bundle-SymbolicName: a\u001b[31mb"));
        refused("other characters", Jars.bundle("Bundle-SymbolicName: a b"));
        refused("fragment of a.host", Jars.bundle("Bundle-SymbolicName: a", "Fragment-Host: a.host"));
        refused("Bundle-Version 'one'", Jars.bundle("Bundle-SymbolicName: a", "Bundle-Version: one"));
        refused("not a readable jar", Jars.bundle("Bundle-SymbolicName: a", "no header"));
        refused("manifest of more than 1 MiB", Jars.zip("META-INF/MANIFEST.MF", "x".repeat((1 << 20) + 1)));
    }

    @Test
    void whatStandsBeforeTheManifestIsUnpackedToALimit() throws IOException {
        String manifest = "Manifest-Version: 1.0\nBundle-SymbolicName: a\n";
        String zeros = "0".repeat(40 << 20);
        assertEquals("a", read(Jars.zip("x", zeros, "META-INF/MANIFEST.MF", manifest)).name());
        refused("more than 64 MiB, unpacked, before", Jars.zip("x", zeros, "y", zeros, "META-INF/MANIFEST.MF", manifest));
        assertEquals("a", read(Jars.zip("META-INF/MANIFEST.MF", manifest, "x", zeros, "y", zeros)).name());
    }

    @Test
    void messagesHoldNothingThatATerminalObeys() throws IOException {
        for (String odd : new String[] {"\u001b]0;x\u0007", "\u009b31m", "\u202e", "\u007f"}) {
            JarContent read = read(Jars.bundle("Bundle-SymbolicName: a", "Fragment-Host: b" + odd + "c"));
            String told = Guest.view(folder.resolve("some.jar"), read, new Decisions(folder)).message();
            assertTrue(told.contains("fragment of b") && told.codePoints().noneMatch(c -> Character.isISOControl(c)
                    || Character.getType(c) == Character.FORMAT), told);
        }
    }

    @Test
    void aJarThatWasCutOffIsRefusedOrTheSameBundle() throws IOException {
        byte[] jar = Jars.bundle("Bundle-SymbolicName: a", "Bundle-Version: 1.0.0");
        int refused = 0;
        for (int length = 0; length < jar.length; length++) {
            JarContent read = read(Arrays.copyOf(jar, length));
            refused += read.refusal().isEmpty() ? 0 : 1;
            assertTrue(!read.refusal().isEmpty() || read.name().equals("a"), "length " + length);
        }
        assertTrue(refused > 50, "only " + refused);
    }

    @Test
    void whatCannotBeReadHasNoHash() throws IOException {
        JarContent missing = JarContent.read(folder.resolve("missing.jar"));
        assertEquals("is not there", missing.refusal());
        assertEquals("", missing.sha256());
        assertEquals("is a folder, not a jar", JarContent.read(folder).refusal());
    }

    @Test
    void theLimitIsExact() throws IOException {
        Path file = Files.write(folder.resolve("big.jar"), new byte[(1 << 20) + 1]);
        JarContent tooLarge = JarContent.read(file, 1 << 20);
        assertEquals("is larger than 1 MiB and is not read", tooLarge.refusal());
        assertNull(tooLarge.bytes());
        assertNotNull(JarContent.read(file, (1 << 20) + 1).bytes());
        assertEquals(64 * 1024 * 1024, JarContent.LIMIT);
    }
}
