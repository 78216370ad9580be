package stirwright.workbench.internal.handlers;

import org.eclipse.e4.core.di.annotations.Execute;
import org.eclipse.swt.widgets.Shell;
import stirwright.workbench.internal.app.CardsWindow;

/** Shows the cards of everything that is installed. */
public final class CardsHandler {
    @Execute
    void run(CardsWindow cards, Shell shell) {
        cards.openIndex(shell);
    }
}
