package stirwright.workbench.tests;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static stirwright.workbench.tests.CardPagesTest.changed;
import static stirwright.workbench.tests.CardPagesTest.changedKey;
import static stirwright.workbench.tests.CardPagesTest.field;
import static stirwright.workbench.tests.CardPagesTest.link;
import static stirwright.workbench.tests.CardPagesTest.name;
import static stirwright.workbench.tests.CardPagesTest.turn;
import static stirwright.workbench.tests.CardPagesTest.turnToConstants;

import java.util.List;
import org.eclipse.swt.SWT;
import org.eclipse.swt.widgets.Event;
import org.eclipse.swt.widgets.Link;
import org.eclipse.swt.widgets.Text;
import org.junit.jupiter.api.Test;
import stirwright.core.Entry;
import stirwright.correlation.Correlation;
import stirwright.study.Case;
import stirwright.study.Constant;
import stirwright.study.OwnConstants;
import stirwright.study.Picks;
import stirwright.workbench.internal.session.CaseEdits;
import stirwright.workbench.internal.session.Row;
import stirwright.workbench.internal.widgets.Names;
import stirwright.workbench.internal.widgets.WordBar;

/** What happens to constants of the case's own while somebody types, and when what they belong to goes. */
class ConstantFieldsTest {
    private static final List<String> DEMO = List.of("demo", "--window");
    private static final String CHANGED = "-changed";

    private static void clear(OpenWindow window, Text field) throws Exception {
        window.run(() -> {
            field.setFocus();
            field.setText("");
        });
        window.settle();
    }

    private static void leave(OpenWindow window) throws Exception {
        window.run(() -> window.find(WordBar.class, "pages of the selected candidate").forceFocus());
        window.settle();
    }

    @Test
    void typingThroughThePublishedValueKeepsThePick() throws Exception {
        OpenWindow.use(DEMO, window -> {
            String id = turnToConstants(window).correlationId();
            String published = window.on(() -> field(window).getText());
            window.typeLetters(name(window), "3.5");
            window.run(() -> window.session().select(changedKey(window)));
            window.type("reason for picking the selected candidate", "measured here");
            window.press("Pick this");
            Text field = field(window);
            clear(window, field);
            assertEquals("", window.on(field::getText), "the blank was filled while somebody typed");
            assertEquals(id + CHANGED, window.outcome().rows().get(0).correlationId());
            String longer = published + (published.contains(".") ? "5" : ".5");
            window.typeLetters(name(window), longer);
            assertEquals(longer, window.on(field::getText));
            assertEquals(id + CHANGED, window.outcome().rows().get(0).correlationId(), "the pick went to the published one");
            assertEquals(Double.parseDouble(longer), OwnConstants.get(current(window), id, name(window).split(" ")[1]).orElseThrow());
            window.typeLetters(name(window), published);
            leave(window);
            assertEquals(id, window.outcome().rows().get(0).correlationId(), "once the field is left, nothing is changed");
            assertEquals(List.of(), window.on(() -> List.copyOf(current(window).getConstants())));
        });
    }

    private static Case current(OpenWindow window) {
        return window.session().current().orElseThrow();
    }

    @Test
    void theFieldStaysWhileItIsCleared() throws Exception {
        OpenWindow.use(DEMO, window -> {
            Row row = turnToConstants(window);
            String published = window.on(() -> field(window).getText());
            window.typeLetters(name(window), "3.5");
            leave(window);
            window.run(() -> window.session().select(changedKey(window)));
            window.settle();
            Text field = field(window);
            clear(window, field);
            assertFalse(window.on(field::isDisposed), "the field went while somebody typed in it");
            window.typeLetters(name(window), published);
            assertFalse(window.on(field::isDisposed), "the field went while somebody typed in it");
            leave(window);
            assertTrue(changed(window).isEmpty());
            assertEquals(row.key(), window.on(() -> window.session().selected().orElseThrow().key()), "the published one is selected");
        });
    }

    @Test
    void takingBackTheLastConstantTakesThePickBackToo() throws Exception {
        OpenWindow.use(DEMO, window -> {
            String id = turnToConstants(window).correlationId();
            window.run(() -> window.session().editor().edit("wrong name", () -> {
                OwnConstants.set(current(window), id, "nobody", 3);
                Picks.choose(current(window), "power-number", id + CHANGED, "measured here");
            }));
            assertTrue(window.outcome().main().result().refusal().isPresent());
            link(window, id + " nobody");
            assertTrue(window.outcome().main().result().refusal().isEmpty());
            assertEquals(id, window.outcome().rows().get(0).correlationId());
        });
    }

    @Test
    void anotherFamilyKeepsTheConstantsThatStillMeanSomething() throws Exception {
        OpenWindow.use(DEMO, window -> {
            List<String> both = window.on(() -> window.session().catalogue().entries().stream().map(Entry::correlation)
                    .filter(c -> !c.constants().names().isEmpty() && c.modifierFor().isEmpty() && c.holdsFor("propeller")
                            && c.holdsFor(window.session().familyId())).map(Correlation::id).toList());
            String own = window.on(() -> window.session().catalogue().entries().stream().map(Entry::correlation)
                    .filter(c -> !c.constants().names().isEmpty() && c.holdsFor(window.session().familyId()) && !c.holdsFor("propeller"))
                    .findFirst().orElseThrow().id());
            window.run(() -> window.session().editor().edit("constants", () -> {
                OwnConstants.set(current(window), both.get(0), "a", 3);
                OwnConstants.set(current(window), own, "a", 3);
            }));
            window.run(() -> new CaseEdits(window.session()).family(current(window), current(window).getImpeller(), "propeller"));
            assertEquals(List.of(both.get(0)), window.on(() -> current(window).getConstants().stream().map(Constant::getCorrelation)
                    .toList()));
        });
    }

    @Test
    void whatCannotBeReadIsFoundAgainAndTakenBack() throws Exception {
        OpenWindow.use(DEMO, window -> {
            turnToConstants(window);
            String name = name(window);
            String published = window.on(() -> field(window).getText());
            window.typeLetters(name, "3x");
            turn(window, 0);
            link(window, "cannot be read");
            assertTrue(window.on(() -> field(window).isFocusControl()), "it leads nowhere");
            window.run(() -> window.all(Link.class, l -> l.isVisible() && String.valueOf(Names.of(l)).contains(", " + name)).get(0)
                    .notifyListeners(SWT.Selection, new Event()));
            assertEquals(published, window.on(() -> field(window).getText()));
            assertFalse(window.on(() -> unreadable(window)));
            window.typeLetters(name, "3x");
            turn(window, 0);
            assertTrue(window.on(() -> unreadable(window)));
            window.run(() -> new CaseEdits(window.session()).duplicateCase(current(window)));
            assertFalse(window.on(() -> unreadable(window)), "it belongs to another case");
        });
    }

    private static boolean unreadable(OpenWindow window) {
        return !window.all(Link.class, l -> l.isVisible() && l.getText().contains("cannot be read")).isEmpty();
    }
}
