package stirwright.console.internal;

import java.nio.file.Path;
import java.time.LocalDate;
import java.util.ArrayList;
import java.util.List;
import stirwright.trust.Approval;
import stirwright.trust.DropIn;
import stirwright.trust.DropIn.State;
import stirwright.trust.DropIns;

/** A drop-in folder in memory; a file whose name ends in .jar is a bundle named like its file. */
final class FakeDoor implements DropIns {
    static final String HASH = "0123456789abcdef".repeat(4);

    final List<DropIn> list = new ArrayList<>();
    final List<String> problems = new ArrayList<>();
    final List<Approval> approved = new ArrayList<>();
    final List<String> declined = new ArrayList<>();

    static DropIn dropIn(String file, State state, String message) {
        return new DropIn(Path.of(file), "invented.family", "1.0.0", HASH, state, message);
    }

    @Override
    public Path folder() {
        return Path.of("families");
    }

    @Override
    public List<DropIn> list() {
        return list;
    }

    @Override
    public List<String> problems() {
        return problems;
    }

    @Override
    public List<Approval> approved() {
        return approved;
    }

    @Override
    public void approve(String sha256) {
        approved.add(new Approval(sha256, "unnamed", LocalDate.of(2030, 1, 31)));
    }

    @Override
    public void approve(DropIn bundle) {
        approved.add(new Approval(bundle.sha256(), bundle.bundle(), LocalDate.of(2030, 1, 31)));
    }

    @Override
    public void decline(String sha256) {
        declined.add(sha256);
    }

    @Override
    public boolean forget(String sha256) {
        return approved.removeIf(approval -> approval.sha256().equals(sha256));
    }

    @Override
    public DropIn read(Path file) {
        return file.toString().endsWith(".jar") ? dropIn(file.toString(), State.ASKS, "")
                : new DropIn(file, "", "", "", State.UNUSABLE, "is not a jar");
    }

    @Override
    public AutoCloseable listen(Runnable changed) {
        throw new AssertionError("a command does not listen");
    }
}
