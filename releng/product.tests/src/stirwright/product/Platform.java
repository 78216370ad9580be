package stirwright.product;

import java.io.IOException;
import java.io.InputStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Map;
import java.util.stream.Stream;
import java.util.zip.ZipEntry;
import java.util.zip.ZipInputStream;

/** A platform that an archive is for, in the framework's words, and the archive. */
enum Platform {
    LINUX_X86_64("linux-x86_64.tar.gz", "linux", "gtk", "x86_64"),
    LINUX_AARCH64("linux-aarch64.tar.gz", "linux", "gtk", "aarch64"),
    WINDOWS_X86_64("windows-x86_64.zip", "win32", "win32", "x86_64"),
    MACOS_AARCH64("macos-aarch64.tar.gz", "macosx", "cocoa", "aarch64"),
    MACOS_X86_64("macos-x86_64.tar.gz", "macosx", "cocoa", "x86_64");

    static final String TOP = "stirwright-0.1.0";

    final String os;
    private final String ending;
    private final String ws;
    private final String arch;

    Platform(String ending, String os, String ws, String arch) {
        this.ending = ending;
        this.os = os;
        this.ws = ws;
        this.arch = arch;
    }

    Map<String, String> frameworkProperties() {
        return Map.of("osgi.os", os, "osgi.ws", ws, "osgi.arch", arch, "org.osgi.framework.os.name", os,
                "org.osgi.framework.processor", arch.replace("x86_64", "x86-64"));
    }

    /** The bundle that draws on this platform. */
    String fragment() {
        return "org.eclipse.swt." + ws + "." + os + "." + arch;
    }

    String startScript() {
        return os.equals("win32") ? "stirwright.cmd" : "stirwright";
    }

    Path archive() {
        return Path.of(System.getProperty("archives"), TOP + "-" + ending);
    }

    /** Unpacks into {@code folder}, which must come to hold the top folder and nothing else, and gives that one. */
    Path unpack(Path folder) throws IOException, InterruptedException {
        Files.createDirectories(folder);
        if (ending.endsWith(".zip")) {
            unzip(folder);
        } else {
            Run run = Run.of(folder, Map.of(), "tar", "-xzf", archive().toString());
            if (run.exitCode() != 0) {
                throw new IOException(run.err());
            }
        }
        try (Stream<Path> entries = Files.list(folder)) {
            return entries.reduce((one, other) -> {
                throw new IllegalStateException("two top entries: " + one + " and " + other);
            }).orElseThrow();
        }
    }

    private void unzip(Path folder) throws IOException {
        try (InputStream in = Files.newInputStream(archive()); ZipInputStream zip = new ZipInputStream(in)) {
            for (ZipEntry entry = zip.getNextEntry(); entry != null; entry = zip.getNextEntry()) {
                Path file = folder.resolve(entry.getName());
                if (entry.isDirectory()) {
                    Files.createDirectories(file);
                } else {
                    Files.createDirectories(file.getParent());
                    Files.copy(zip, file);
                }
            }
        }
    }
}
