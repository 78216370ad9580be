package stirwright.chart.internal;

import java.util.stream.Collectors;
import org.eclipse.swt.accessibility.ACC;
import org.eclipse.swt.accessibility.Accessible;
import org.eclipse.swt.accessibility.AccessibleAdapter;
import org.eclipse.swt.accessibility.AccessibleControlAdapter;
import org.eclipse.swt.accessibility.AccessibleControlEvent;
import org.eclipse.swt.accessibility.AccessibleEvent;
import stirwright.chart.Picture;

/** What a screen reader is told. */
public final class Voice {
    private final Board board;

    public Voice(Board board) {
        this.board = board;
        Accessible accessible = board.plotArea().getAccessible();
        accessible.addAccessibleListener(new AccessibleAdapter() {
            @Override
            public void getName(AccessibleEvent event) {
                event.result = name();
            }

            @Override
            public void getDescription(AccessibleEvent event) {
                event.result = description();
            }
        });
        accessible.addAccessibleControlListener(new AccessibleControlAdapter() {
            @Override
            public void getRole(AccessibleControlEvent event) {
                event.detail = ACC.ROLE_GRAPHIC;
            }

            @Override
            public void getValue(AccessibleControlEvent event) {
                event.result = description();
            }
        });
        board.onSpoken(() -> accessible.sendEvent(ACC.EVENT_DESCRIPTION_CHANGED, new Object[] {"", description()}));
    }

    /** What the chart shows. */
    public String name() {
        Picture picture = board.picture();
        return board.scene().empty() ? Wording.of("chart")
                : Wording.of("chart.of", picture.y().words(), picture.x().words());
    }

    /** The reading at the cursor; without one, what there is to read and how. */
    public String description() {
        if (board.scene().empty()) {
            return board.picture().emptyMessage();
        }
        if (board.cursor() != null) {
            return board.cursor().words(board.scene());
        }
        int points = board.scene().points.stream().mapToInt(p -> p.points().x().length).sum();
        return (points > 0 ? Wording.of("points", points) : "")
                + board.picture().rules().stream().map(RulePainter::inWords).collect(Collectors.joining())
                + Wording.of("curves", board.scene().traces().size());
    }
}
