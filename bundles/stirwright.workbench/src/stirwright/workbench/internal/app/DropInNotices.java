package stirwright.workbench.internal.app;

import jakarta.annotation.PostConstruct;
import jakarta.inject.Inject;
import java.io.UncheckedIOException;
import java.util.List;
import java.util.Set;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import org.eclipse.e4.core.di.annotations.Optional;
import org.eclipse.swt.program.Program;
import org.eclipse.swt.widgets.Display;
import stirwright.trust.DropIn;
import stirwright.trust.DropIns;
import stirwright.workbench.internal.Messages;

/** Asks about jars that were dropped in and may not run yet, and tells about those that cannot. */
public final class DropInNotices {
    private static final String PREFIX = "dropin ";

    @Inject
    private Notices notices;

    @Inject
    @Optional
    private DropIns dropIns;

    @PostConstruct
    void watch() {
        if (dropIns == null) {
            return;
        }
        Display display = Display.getCurrent();
        AutoCloseable listening = dropIns.listen(() -> later(display));
        display.disposeExec(() -> end(listening));
        show();
    }

    private void later(Display display) {
        // The bundles go on arriving while the window closes.
        if (!display.isDisposed()) {
            display.asyncExec(this::show);
        }
    }

    private static void end(AutoCloseable listening) {
        try {
            listening.close();
        } catch (Exception impossible) {
            // Declared by AutoCloseable alone: ending a listening has nothing that could fail.
            throw new IllegalStateException(impossible);
        }
    }

    private void show() {
        List<DropIn> all = dropIns.list();
        Set<String> current = Stream.concat(
                all.stream().filter(this::needsWords).map(DropInNotices::key),
                dropIns.problems().stream().map(p -> PREFIX + p)).collect(Collectors.toSet());
        notices.removeIf(key -> key.startsWith(PREFIX) && !current.contains(key));
        all.stream().filter(this::needsWords).forEach(this::put);
        dropIns.problems().forEach(p -> notices.put(new Notice(PREFIX + p, p, List.of())));
    }

    private boolean needsWords(DropIn one) {
        return one.state() == DropIn.State.ASKS || one.state() == DropIn.State.UNUSABLE;
    }

    private static String key(DropIn one) {
        return PREFIX + one.file() + " " + one.sha256() + " " + one.state() + " " + one.message();
    }

    private void put(DropIn one) {
        if (one.state() == DropIn.State.UNUSABLE) {
            notices.put(new Notice(key(one),
                    Messages.bind(Messages.DropIn_unusable, one.file().getFileName(), one.message()), List.of()));
            return;
        }
        notices.put(new Notice(key(one), Messages.bind(Messages.DropIn_asks,
                new Object[] {one.file().getFileName(), one.bundle(), one.sha256()}),
                List.of(new Notice.Action(Messages.DropIn_approve, () -> settle(() -> dropIns.approve(one))),
                        new Notice.Action(Messages.DropIn_decline, () -> settle(() -> dropIns.decline(one.sha256()))))));
    }

    private void settle(Runnable word) {
        try {
            word.run();
        } catch (UncheckedIOException unwritable) {
            notices.put(new Notice("approval", unwritable.getMessage(), List.of()));
            show();
        }
    }

    /** Asks again about those that were declined. */
    public void askAgain() {
        if (dropIns != null) {
            dropIns.list().stream().filter(d -> d.state() == DropIn.State.DECLINED)
                    .forEach(d -> settle(() -> dropIns.forget(d.sha256())));
            show();
        }
    }

    /** Shows the folder that jars are dropped into. */
    public void openFolder() {
        if (dropIns != null) {
            Program.launch(dropIns.folder().toString());
        }
    }
}
