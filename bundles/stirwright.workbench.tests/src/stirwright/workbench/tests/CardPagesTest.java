package stirwright.workbench.tests;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.eclipse.swt.SWT;
import org.eclipse.swt.widgets.Button;
import org.eclipse.swt.widgets.Event;
import org.eclipse.swt.widgets.Label;
import org.eclipse.swt.widgets.Link;
import org.eclipse.swt.widgets.Text;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import stirwright.study.Case;
import stirwright.study.OwnConstants;
import stirwright.study.StudyFiles;
import stirwright.workbench.internal.session.Outcome;
import stirwright.workbench.internal.session.Row;
import stirwright.workbench.internal.widgets.WordBar;

/** The card's pages: constants of the selected correlation, and the factors on it. */
class CardPagesTest {
    private static final List<String> DEMO = List.of("demo", "--window");
    private static final String CHANGED = "-changed";

    @TempDir
    Path folder;

    /** Turns the card's page with the arrow keys. */
    static void turn(OpenWindow window, int page) throws Exception {
        window.run(() -> {
            WordBar bar = window.find(WordBar.class, "pages of the selected candidate");
            bar.forceFocus();
            while (bar.current() != page) {
                Event key = new Event();
                key.keyCode = bar.current() < page ? SWT.ARROW_RIGHT : SWT.ARROW_LEFT;
                bar.notifyListeners(SWT.KeyDown, key);
            }
        });
        window.settle();
    }

    /** Selects the first correlation that has constants, and turns to their page. */
    static Row turnToConstants(OpenWindow window) throws Exception {
        Row row = window.outcome().rows().stream().filter(r -> !r.correlation().orElseThrow().constants().names().isEmpty())
                .findFirst().orElseThrow();
        window.run(() -> window.session().select(row.key()));
        turn(window, 1);
        return row;
    }

    /** The field of the first constant of the selected correlation. */
    static Text field(OpenWindow window) throws Exception {
        return window.on(() -> window.all(Text.class, t -> t.isVisible() && String.valueOf(
                t.getData("stirwright.name")).startsWith("constant ")).get(0));
    }

    static String name(OpenWindow window) throws Exception {
        Text text = field(window);
        return window.on(() -> (String) text.getData("stirwright.name"));
    }

    static Optional<Row> changed(OpenWindow window) throws Exception {
        return window.outcome().rows().stream().filter(r -> r.correlationId().endsWith(CHANGED)).findFirst();
    }

    private static Case current(OpenWindow window) throws Exception {
        return window.on(() -> window.session().current().orElseThrow());
    }

    @Test
    void anotherValueMakesACandidateBesideThePublishedOne() throws Exception {
        OpenWindow.use(DEMO, window -> {
            Outcome before = window.outcome();
            Row row = turnToConstants(window);
            byte[] start = window.on(() -> StudyFiles.bytes(window.session().editor().study()));
            String name = name(window);
            String published = window.on(() -> field(window).getText());
            String formula = row.correlation().orElseThrow().formulaByName();
            assertTrue(formula.contains(name.split(" ")[1]), formula);
            assertTrue(window.on(() -> window.all(Label.class, l -> l.isVisible() && l.getText().equals(formula)).size() == 1),
                    "the constants stand there without a meaning");
            assertEquals("<a>Full card</a>", cardLink(window));
            window.typeLetters(name, "3.5");
            Row changed = changed(window).orElseThrow();
            assertEquals(row.correlationId() + CHANGED, changed.correlationId());
            assertEquals(name.split(" ")[1] + " = 3.5: " + row.title(), changed.title());
            assertEquals("excluded", changed.role().id());
            assertEquals(before.rows().size() + 1, window.outcome().rows().size());
            for (Row other : before.rows()) {
                Row now = window.outcome().rows().stream().filter(r -> r.key().equals(other.key())).findFirst().orElseThrow();
                assertEquals(other.value(), now.value(), 0.0, other.key());
                assertEquals(other.style(), now.style(), "a curve changed its colour");
            }
            assertEquals(3.5, OwnConstants.get(current(window), row.correlationId(), name.split(" ")[1]).orElseThrow());
            agrees(window);
            window.run(() -> window.session().undo());
            assertArrayEquals(start, window.on(() -> StudyFiles.bytes(window.session().editor().study())), "one step");
            assertEquals(published, window.on(() -> field(window).getText()));
            window.run(() -> window.session().redo());
            assertEquals("3.5", window.on(() -> field(window).getText()));
            link(window, "as shipped");
            assertTrue(changed(window).isEmpty());
            assertEquals(published, window.on(() -> field(window).getText()));
            assertArrayEquals(start, window.on(() -> StudyFiles.bytes(window.session().editor().study())));
        });
    }

    @Test
    void whatCannotBeReadIsCountedAndChangesNothing() throws Exception {
        OpenWindow.use(DEMO, window -> {
            turnToConstants(window);
            window.typeLetters(name(window), "3x");
            assertTrue(changed(window).isEmpty());
            assertTrue(window.on(() -> !window.all(Link.class, l -> l.getText().contains("cannot be read: 1")).isEmpty()));
            window.typeLetters(name(window), "3");
            assertTrue(changed(window).isPresent());
            assertTrue(window.on(() -> window.all(Link.class, l -> l.isVisible() && l.getText().contains("cannot be read")).isEmpty()));
        });
    }

    @Test
    void aPickOfTheChangedOneGoesBackWithItsConstants() throws Exception {
        OpenWindow.use(DEMO, window -> {
            String recommended = window.outcome().rows().get(0).correlationId();
            String id = turnToConstants(window).correlationId();
            window.typeLetters(name(window), "3.5");
            window.run(() -> window.session().select(changedKey(window)));
            assertEquals("3.5", window.on(() -> field(window).getText()), "the changed one shows the same constants");
            assertEquals("<a>Full card of the published one</a>", cardLink(window));
            window.type("reason for picking the selected candidate", "measured here");
            window.press("Pick this");
            assertEquals(id + CHANGED, window.outcome().rows().get(0).correlationId());
            assertEquals("chosen", window.outcome().rows().get(0).role().id());
            agrees(window);
            link(window, "as shipped");
            assertTrue(window.outcome().main().result().refusal().isEmpty());
            assertEquals(id, window.outcome().rows().get(0).correlationId(), "the pick stays, with the published constants");
            assertFalse(id.equals(recommended));
            window.run(() -> window.session().undo());
            assertEquals(id + CHANGED, window.outcome().rows().get(0).correlationId());
        });
    }

    private static String cardLink(OpenWindow window) throws Exception {
        return window.on(() -> window.find(Link.class, "full card of the selected candidate").getText());
    }

    static String changedKey(OpenWindow window) {
        return window.session().outcome().orElseThrow().rows().stream().filter(r -> r.correlationId().endsWith(CHANGED))
                .findFirst().orElseThrow().key();
    }

    @Test
    void anEffectIsSwitchedOffAndOnByItsCheckMark() throws Exception {
        OpenWindow.use(DEMO, window -> {
            window.type("Liquid height, m", "");
            window.type("Impeller count", "2");
            window.type("Liquid height, m", "1.2");
            turn(window, 2);
            String id = window.outcome().rows().get(0).correlationId();
            double two = power(window, id);
            Button check = window.on(() -> window.all(Button.class, b -> b.isVisible() && b.getText().endsWith("several impellers on the shaft"))
                    .get(0));
            String text = window.on(check::getText);
            double factor = Double.parseDouble(text.substring("times ".length(), text.indexOf(':')));
            assertTrue(factor > 1 && factor <= 2, text);
            assertTrue(window.on(() -> window.all(Label.class, l -> l.isVisible() && l.getText().contains("range: ")
                    && l.getText().contains("source: ")).size() >= 1), "no range and source beside it");
            assertTrue(window.on(check::getSelection));
            assertTrue(window.on(() -> reachedByTab(window, check)), "not reached by the keyboard");
            window.press(window.on(check::getText));
            assertEquals(List.of("several-impellers"), window.on(() -> List.copyOf(
                    window.session().current().orElseThrow().getLeftOut())));
            assertEquals(two / factor, power(window, id), 1e-3 * two, "the text has four digits");
            assertFalse(window.on(check::isDisposed), "the focus is lost");
            assertFalse(window.on(check::getSelection));
            List<Map<String, String>> console = agrees(window);
            assertTrue(console.get(0).get("notes").contains("as the case says; it would be times "), console.get(0).get("notes"));
            window.run(() -> window.session().undo());
            assertEquals(two, power(window, id), 0.0);
            assertTrue(window.on(check::getSelection));
        });
    }

    private static double power(OpenWindow window, String correlationId) throws Exception {
        return window.outcome().rows().stream().filter(r -> r.correlationId().equals(correlationId)).findFirst().orElseThrow()
                .value();
    }

    /** Whether a few tabs from the words above the page lead there. */
    private static boolean reachedByTab(OpenWindow window, Button check) {
        window.find(WordBar.class, "pages of the selected candidate").forceFocus();
        for (int keys = 0; keys < 8 && !check.isFocusControl(); keys++) {
            window.display().getFocusControl().traverse(SWT.TRAVERSE_TAB_NEXT);
        }
        return check.isFocusControl();
    }

    @Test
    void anEffectThatNobodyKnowsCanBeTakenBack() throws Exception {
        OpenWindow.use(DEMO, window -> {
            window.run(() -> window.session().editor().edit("wobble",
                    () -> window.session().current().orElseThrow().getLeftOut().add("wobble")));
            assertTrue(window.outcome().main().result().refusal().isPresent());
            turn(window, 2);
            window.press("wobble");
            assertTrue(window.outcome().main().result().refusal().isEmpty());
            window.run(() -> window.session().editor().edit("gone",
                    () -> OwnConstants.set(window.session().current().orElseThrow(), "gone.np.away", "a", 3)));
            assertTrue(window.outcome().main().result().refusal().isPresent());
            turn(window, 1);
            link(window, "gone.np.away a");
            assertTrue(window.outcome().main().result().refusal().isEmpty());
        });
    }

    static void link(OpenWindow window, String words) throws Exception {
        window.run(() -> window.all(Link.class, l -> l.isVisible() && l.getText().contains(words)).get(0)
                .notifyListeners(SWT.Selection, new Event()));
        window.settle();
    }

    /** The command line has the same numbers. */
    private List<Map<String, String>> agrees(OpenWindow window) throws Exception {
        Outcome outcome = window.outcome();
        Path study = Files.createTempFile(folder, "edited", ".stir");
        window.run(() -> StudyFiles.write(window.session().editor().study(), study));
        List<Map<String, String>> console = Console.rows(study, current(window).getName(), outcome.catalogue());
        assertEquals(outcome.rows().stream().map(r -> r.correlationId() + " " + r.value()).toList(),
                console.stream().map(r -> r.get("correlation") + " " + Double.parseDouble(r.get("power_number"))).toList());
        return console;
    }
}
