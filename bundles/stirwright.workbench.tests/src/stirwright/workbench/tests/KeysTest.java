package stirwright.workbench.tests;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.eclipse.swt.SWT;
import org.eclipse.swt.widgets.Button;
import org.eclipse.swt.widgets.Combo;
import org.eclipse.swt.widgets.Event;
import org.eclipse.swt.widgets.Label;
import org.eclipse.swt.widgets.Link;
import org.eclipse.swt.widgets.Table;
import org.eclipse.swt.widgets.TableItem;
import org.eclipse.swt.widgets.Text;
import org.junit.jupiter.api.Test;
import stirwright.study.Picks;
import stirwright.study.StudyFiles;
import stirwright.workbench.internal.session.Row;
import stirwright.workbench.internal.session.View;

/** Typing letter by letter, and what must not get lost on the way. */
class KeysTest {
    private static final List<String> DEMO = List.of("demo", "--window");
    private static final String SPEED = "Speed, rev/min";

    @Test
    void aNameIsTypedWithoutLosingTheFocus() throws Exception {
        OpenWindow.use(DEMO, window -> {
            window.typeLetters("name of the case", "A & B <a>");
            assertEquals("A & B <a>", window.on(() -> window.session().current().orElseThrow().getName()));
            assertTrue(window.on(() -> List.of(window.find(Combo.class, "Case").getItems()).contains("A & B <a>")));
            window.typeLetters("name of the fluid", "slip");
            assertEquals("slip", window.on(() -> window.session().current().orElseThrow().getFluid().getName()));
            window.run(() -> window.session().undo());
            window.run(() -> window.session().undo());
            assertEquals("dipping", window.on(() -> window.session().current().orElseThrow().getName()));
            assertFalse(window.on(() -> window.session().editor().canUndo()), "each name is one step");
        });
    }

    @Test
    void whatCannotBeReadLeavesTheStudyAsItWas() throws Exception {
        OpenWindow.use(DEMO, window -> {
            byte[] before = bytes(window);
            double power = window.outcome().rows().get(0).power();
            window.typeLetters(SPEED, "12x");
            window.run(() -> window.find(Text.class, "Density, kg/m3").forceFocus());
            window.settle();
            assertEquals("12x", window.on(() -> window.find(Text.class, SPEED).getText()), "the text is gone");
            assertArrayEquals(before, bytes(window), "the study has a speed that nobody finished typing");
            assertEquals(power, window.outcome().rows().get(0).power(), 0.0);
            assertTrue(window.on(() -> !window.all(Link.class, l -> l.getText().contains("cannot be read: 1")).isEmpty()));
            window.press("pitched-blade turbine");
            assertEquals("12x", window.on(() -> window.find(Text.class, SPEED).getText()), "lost where fields were made anew");
            assertTrue(window.on(() -> !window.all(Link.class, l -> l.getText().contains("cannot be read: 1")).isEmpty()));
            window.typeLetters(SPEED, "90");
            assertEquals(1.5, window.outcome().rows().get(0).speed(), 1e-15);
        });
    }

    @Test
    void theFocusStaysWhereAChoiceRebuildsTheFields() throws Exception {
        OpenWindow.use(DEMO, window -> {
            for (String[] choice : new String[][] {{"Settled by", "target shear rate"}, {"Model", "Bingham"},
                    {"Family", "pitched-blade turbine"}}) {
                window.run(() -> window.find(Combo.class, choice[0]).forceFocus());
                window.choose(choice[0], choice[1]);
                assertTrue(window.on(() -> window.find(Combo.class, choice[0]).isFocusControl()), choice[0] + " lost the focus");
            }
        });
    }

    @Test
    void anotherKindOfDemandKeepsTheNumber() throws Exception {
        OpenWindow.use(DEMO, window -> {
            double rate = window.outcome().rows().get(0).speed();
            window.choose("Settled by", "speed in rev/s");
            assertEquals("3", window.on(() -> window.find(Text.class, "Speed, rev/s").getText()));
            window.choose("Settled by", "target tip speed");
            window.choose("Settled by", "speed in rev/min");
            assertEquals(rate, window.outcome().rows().get(0).speed(), 1e-9);
            window.run(() -> window.session().undo());
            assertEquals("target tip speed", window.on(() -> window.find(Combo.class, "Settled by").getText()));
        });
    }

    @Test
    void aStudyWithoutACaseShowsNoNumbers() throws Exception {
        OpenWindow.use(DEMO, window -> {
            window.run(() -> window.session().editor().edit("empty", () -> window.session().editor().study().getCases().clear()));
            window.settle();
            assertEquals(0, (int) window.on(() -> window.find(Table.class, "candidates").getItemCount()));
            assertTrue(window.outcome().picture().curves().isEmpty());
            assertFalse(window.on(() -> button(window, "Pick this").isEnabled()));
            assertTrue(window.on(() -> !window.all(Label.class, l -> l.getText().startsWith("This study has no case")).isEmpty()));
            window.run(() -> window.session().undo());
            assertFalse(window.outcome().rows().isEmpty());
        });
    }

    @Test
    void picksOfAnotherFamilyGoWithItsImpeller() throws Exception {
        OpenWindow.use(DEMO, window -> {
            select(window, 1);
            window.type("reason for picking the selected candidate", "tested");
            window.press("Pick this");
            window.choose("Impeller", "pitched blades");
            assertTrue(window.outcome().main().result().refusal().isEmpty(), () -> "refused by a pick of another family");
            window.run(() -> window.session().undo());
            assertEquals("chosen", window.outcome().rows().get(0).role().id());
        });
    }

    @Test
    void aPickThatIsNotInstalledCanBeTakenBack() throws Exception {
        OpenWindow.use(DEMO, window -> {
            window.run(() -> window.session().editor().edit("pick", () -> Picks.choose(
                    window.session().current().orElseThrow(), "power-number", "gone.np.away", "once")));
            window.settle();
            assertTrue(window.outcome().main().result().refusal().isPresent());
            window.press("Use the recommended");
            assertFalse(window.outcome().rows().isEmpty());
        });
    }

    @Test
    void aReasonIsForTheCandidateThatItWasTypedFor() throws Exception {
        OpenWindow.use(DEMO, window -> {
            select(window, 1);
            window.type("reason for picking the selected candidate", "tested");
            select(window, 2);
            assertEquals("", window.on(() -> window.find(Text.class, "reason for picking the selected candidate").getText()));
            assertFalse(window.on(() -> button(window, "Pick this").isEnabled()));
        });
    }

    @Test
    void undoTurnsToTheCaseThatItChanges() throws Exception {
        OpenWindow.use(DEMO, window -> {
            window.type(SPEED, "240");
            window.run(() -> window.session().turnTo(window.session().editor().study().getCases().get(4)));
            window.run(() -> window.session().undo());
            assertEquals("dipping", window.on(() -> window.session().current().orElseThrow().getName()));
            window.run(() -> window.session().turnTo(window.session().editor().study().getCases().get(4)));
            window.run(() -> window.session().redo());
            assertEquals("dipping", window.on(() -> window.session().current().orElseThrow().getName()));
            assertEquals(4.0, window.outcome().rows().get(0).speed(), 1e-15);
        });
    }

    @Test
    void aComparedFamilyNeverPosesAsThePick() throws Exception {
        OpenWindow.use(DEMO, window -> {
            window.press("pitched-blade turbine");
            window.type("Blade length, m", "0.5");
            assertTrue(window.outcome().main().result().refusal().isPresent());
            for (Row row : window.outcome().rows()) {
                assertFalse(row.pick(), row.key());
                assertTrue(Double.isNaN(row.deviation()), row.key());
            }
            window.run(() -> window.session().show(View.FLOW_NUMBER));
            assertTrue(window.outcome().rows().stream().noneMatch(Row::pick));
        });
    }

    private static Button button(OpenWindow window, String verb) {
        return window.all(Button.class, b -> b.getText().equals(verb)).get(0);
    }

    private static void select(OpenWindow window, int index) throws Exception {
        window.run(() -> {
            Table table = window.find(Table.class, "candidates");
            TableItem item = table.getItem(index);
            table.setSelection(item);
            Event event = new Event();
            event.item = item;
            table.notifyListeners(SWT.Selection, event);
        });
    }

    private static byte[] bytes(OpenWindow window) throws Exception {
        return window.on(() -> StudyFiles.bytes(window.session().editor().study()));
    }
}
