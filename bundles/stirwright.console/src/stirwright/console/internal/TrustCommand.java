package stirwright.console.internal;

import java.io.UncheckedIOException;
import java.nio.file.Path;
import java.util.concurrent.Callable;
import picocli.CommandLine.ArgGroup;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;
import stirwright.trust.DropIn;
import stirwright.trust.DropIn.State;
import stirwright.trust.DropIns;
import stirwright.trust.UserFolder;

@Command(name = TrustCommand.NAME,
        description = "Approves a bundle, so that it runs when it lies in the folder families. A bundle is known by the"
                + " SHA-256 of its jar: another content asks again. An approved bundle runs with all rights of this program"
                + " and of you.")
final class TrustCommand implements Callable<Integer> {
    static final String NAME = "trust";

    private static final String WARNING = "An approved bundle runs with all rights of this program and of you; nothing"
            + " confines it.";

    private final Desk desk;

    @ArgGroup(multiplicity = "1")
    private Wish wish;

    /** What is asked for: exactly one. */
    static final class Wish {
        @Parameters(paramLabel = "FILE", description = "the jar to approve; it need not be in the folder yet")
        private Path file;

        @Option(names = "--list", description = "show what is approved, and what is in the folder with its state")
        private boolean list;

        @Option(names = "--decline", paramLabel = "FILE-OR-HASH",
                description = "ask no more about it; what runs stops; it can be approved later")
        private String decline;

        @Option(names = "--forget", paramLabel = "FILE-OR-HASH", description = "take it off the lists; it stops and asks again")
        private String forget;
    }

    TrustCommand(Desk desk) {
        this.desk = desk;
    }

    @Override
    public Integer call() {
        DropIns dropIns = desk.dropIns();
        try {
            if (wish.list) {
                new TrustView(desk.out()).print(dropIns, UserFolder.path());
                return ExitCode.OK;
            }
            return wish.file != null ? approve(dropIns)
                    : wish.decline != null ? decline(dropIns, wish.decline) : forget(dropIns, wish.forget);
        } catch (UncheckedIOException unwritable) {
            return refuse(unwritable.getMessage());
        }
    }

    private int approve(DropIns dropIns) {
        DropIn bundle = dropIns.read(wish.file);
        if (bundle.state() == State.UNUSABLE) {
            return refuse(wish.file + " " + bundle.message());
        }
        say(bundle.bundle(), "SHA-256 " + bundle.sha256(), WARNING);
        dropIns.approve(bundle);
        say("Approved. It runs in every run from now on, and in a running window within a second, when it lies in "
                + dropIns.folder() + ".");
        return ExitCode.OK;
    }

    private int decline(DropIns dropIns, String fileOrHash) {
        String hash = hash(dropIns, fileOrHash);
        if (hash.isEmpty()) {
            return ExitCode.UNUSABLE;
        }
        dropIns.decline(hash);
        say("Declined; it does not run and nothing asks about it. 'stirwright trust FILE' approves it all the same.");
        return ExitCode.OK;
    }

    private int forget(DropIns dropIns, String fileOrHash) {
        String hash = hash(dropIns, fileOrHash);
        if (hash.isEmpty()) {
            return ExitCode.UNUSABLE;
        }
        if (!dropIns.forget(hash)) {
            return refuse(fileOrHash + " is neither approved nor declined; 'stirwright trust --list' shows what is");
        }
        say("Forgotten; it does not run and asks again.");
        return ExitCode.OK;
    }

    /** Empty when there is none; then it has been told why. */
    private String hash(DropIns dropIns, String fileOrHash) {
        if (fileOrHash.matches("[0-9a-fA-F]{64}")) {
            return fileOrHash;
        }
        DropIn bundle = dropIns.read(Path.of(fileOrHash));
        if (bundle.sha256().isEmpty()) {
            refuse(fileOrHash + " " + bundle.message() + "; a SHA-256 of 64 digits would do too, 'stirwright trust --list'"
                    + " shows them");
        }
        return bundle.sha256();
    }

    private int refuse(String message) {
        desk.err().println(Plain.line(message));
        return ExitCode.UNUSABLE;
    }

    private void say(String... lines) {
        StringBuilder text = new StringBuilder();
        for (String line : lines) {
            Columns.appendWrapped(text, "", line, CaseView.WIDTH);
        }
        desk.out().print(Plain.text(text));
        desk.out().flush();
    }
}
