package stirwright.workbench.internal.app;

import jakarta.annotation.PostConstruct;
import jakarta.inject.Inject;
import java.util.Arrays;
import org.eclipse.swt.SWT;
import org.eclipse.swt.layout.GridData;
import org.eclipse.swt.layout.GridLayout;
import org.eclipse.swt.widgets.Composite;
import stirwright.workbench.internal.Messages;
import stirwright.workbench.internal.session.Page;
import stirwright.workbench.internal.session.Pages;
import stirwright.workbench.internal.widgets.Looks;
import stirwright.workbench.internal.widgets.WordBar;

/** The pages of the window, in words. */
public final class PageSelector {
    @Inject
    private Looks looks;

    @Inject
    private Pages pages;

    @PostConstruct
    void create(Composite parent) {
        Composite area = looks.onPage(new Wide(parent));
        GridLayout layout = new GridLayout(1, false);
        layout.marginWidth = 3 * Looks.STEP;
        layout.marginHeight = 0;
        area.setLayout(layout);
        WordBar bar = new WordBar(area, looks, Messages.Page_selector,
                Arrays.stream(Page.values()).map(Page::title).toList(), i -> pages.turnTo(Page.values()[i]));
        bar.setFont(looks.strong());
        bar.setLayoutData(new GridData(SWT.LEFT, SWT.CENTER, true, false));
        pages.onTurn(() -> bar.setCurrent(pages.current().ordinal()));
    }
}
