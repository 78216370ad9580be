package stirwright.workbench.internal.app;

import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Optional;
import java.util.function.Consumer;
import org.eclipse.swt.SWT;
import org.eclipse.swt.SWTError;
import org.eclipse.swt.browser.Browser;
import org.eclipse.swt.browser.LocationEvent;
import org.eclipse.swt.browser.LocationListener;
import org.eclipse.swt.graphics.Rectangle;
import org.eclipse.swt.layout.GridData;
import org.eclipse.swt.layout.GridLayout;
import org.eclipse.swt.program.Program;
import org.eclipse.swt.widgets.Button;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Shell;
import stirwright.workbench.internal.Messages;
import stirwright.workbench.internal.widgets.Looks;
import stirwright.workbench.internal.widgets.Names;

/** A shell with the system's browser engine in it. */
final class CardsBrowser {
    private static final int WIDTH = 960;
    private static final int HEIGHT = 760;

    private final Shell shell;
    private final Browser browser;
    private final Button back;
    private final Consumer<String> notOutside;

    private CardsBrowser(Shell parent, Looks looks, Consumer<String> notOutside) {
        this.notOutside = notOutside;
        shell = looks.onPage(new Shell(parent, SWT.SHELL_TRIM));
        shell.setText(Messages.Cards_title);
        GridLayout layout = new GridLayout(1, false);
        layout.marginWidth = 0;
        layout.marginHeight = 0;
        shell.setLayout(layout);
        Composite bar = looks.area(shell);
        bar.setLayout(new GridLayout(2, false));
        back = looks.button(bar, Messages.Cards_back, this::goBack);
        looks.button(bar, Messages.Cards_outside, this::openOutside);
        browser = Names.name(new Browser(shell, SWT.NONE), Messages.Cards_name);
        browser.setLayoutData(new GridData(SWT.FILL, SWT.FILL, true, true));
        browser.addTitleListener(event -> shell.setText(event.title.isBlank() ? Messages.Cards_title : event.title));
        browser.addLocationListener(LocationListener.changedAdapter(this::arrived));
        shell.addListener(SWT.Traverse, event -> {
            if (event.detail == SWT.TRAVERSE_ESCAPE) {
                event.doit = false;
                shell.close();
            }
        });
        Rectangle around = parent.getBounds();
        shell.setBounds(around.x + (around.width - WIDTH) / 2, around.y + Math.max(0, (around.height - HEIGHT) / 2), WIDTH, HEIGHT);
    }

    /**
     * Empty when this machine has no browser engine that a window can hold.
     *
     * @param notOutside receives the address that the system's browser did not open
     */
    static Optional<CardsBrowser> open(Shell parent, Looks looks, Consumer<String> notOutside) {
        int shells = parent.getShells().length;
        try {
            return Optional.of(new CardsBrowser(parent, looks, notOutside));
        } catch (SWTError noEngine) {
            Shell[] left = parent.getShells();
            if (left.length > shells) {
                left[left.length - 1].dispose();
            }
            return Optional.empty();
        }
    }

    boolean isOpen() {
        return !shell.isDisposed();
    }

    Shell parent() {
        return (Shell) shell.getParent();
    }

    void show(Path page) {
        browser.setUrl(page.toUri().toString());
        shell.open();
        browser.setFocus();
    }

    /** Shows what was written anew, at the same place and wherever the focus is; the index where the page is gone. */
    void reload(Path index) {
        if (Files.exists(index.resolveSibling(page()))) {
            browser.refresh();
        } else {
            browser.setUrl(index.toUri().toString());
        }
    }

    /** The name of the file that is shown. */
    private String page() {
        String address = browser.getUrl().replaceFirst("[#?].*", "");
        return address.substring(address.lastIndexOf('/') + 1);
    }

    private void arrived(LocationEvent event) {
        back.setEnabled(browser.isBackEnabled());
    }

    private void goBack() {
        browser.back();
    }

    private void openOutside() {
        if (!Program.launch(browser.getUrl())) {
            notOutside.accept(browser.getUrl());
        }
    }
}
