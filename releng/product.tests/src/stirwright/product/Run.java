package stirwright.product;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.concurrent.TimeUnit;

/** What a finished process left. */
record Run(int exitCode, String out, String err) {

    /** Runs {@code command} in {@code folder}; a variable with an empty value is taken out of the environment. */
    static Run of(Path folder, Map<String, String> environment, String... command)
            throws IOException, InterruptedException {
        try (Started started = start(folder, environment, command)) {
            return started.end();
        }
    }

    static Started start(Path folder, Map<String, String> environment, String... command) throws IOException {
        Path out = Files.createTempFile("out", ".txt");
        Path err = Files.createTempFile("err", ".txt");
        ProcessBuilder builder = new ProcessBuilder(List.of(command)).directory(folder.toFile())
                .redirectOutput(out.toFile()).redirectError(err.toFile());
        environment.forEach((name, value) -> {
            if (value.isEmpty()) {
                builder.environment().remove(name);
            } else {
                builder.environment().put(name, value);
            }
        });
        return new Started(builder.start(), out, err);
    }

    /** A process that runs; closing ends it the hard way if it still does. */
    record Started(Process process, Path out, Path err) implements AutoCloseable {

        Run end() throws IOException, InterruptedException {
            if (!process.waitFor(90, TimeUnit.SECONDS)) {
                throw new IOException("still runs after 90 s; it printed " + Files.readString(out) + Files.readString(err));
            }
            return new Run(process.exitValue(), Files.readString(out), Files.readString(err));
        }

        @Override
        public void close() throws IOException {
            process.destroyForcibly();
            Files.delete(out);
            Files.delete(err);
        }
    }
}
