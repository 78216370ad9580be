package stirwright.workbench.tests;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import org.eclipse.swt.graphics.Point;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Control;
import org.eclipse.swt.widgets.ScrollBar;
import org.eclipse.swt.widgets.Table;
import org.eclipse.swt.widgets.TableColumn;
import org.junit.jupiter.api.Test;
import stirwright.study.Curve;
import stirwright.workbench.internal.flow.FlowCurves;
import stirwright.workbench.internal.flow.FlowView;
import stirwright.workbench.internal.session.Page;
import stirwright.workbench.internal.widgets.Names;

/** How the flow-curve page looks: pictures to look at, no text cut, names for those who hear it, nothing to scroll sideways. */
class FlowLooksTest {

    @Test
    void pictures() throws Exception {
        OpenWindow.use(LooksTest.DEMO, window -> {
            LooksTest.size(window, LooksTest.NORMAL);
            FlowPageTest.turnTo(window, Page.FLOW_CURVE);
            FlowPageTest.settle(window);
            LooksTest.picture(window, "flow-empty");
            FlowPageTest.add(window, InventedCurves.ramps());
            for (FlowView view : FlowView.values()) {
                window.run(() -> FlowPageTest.of(window, FlowCurves.class).show(view));
                FlowPageTest.settle(window);
                LooksTest.picture(window, "flow-" + view.name().toLowerCase());
            }
            window.press("Pick this model");
            window.run(() -> FlowPageTest.of(window, FlowCurves.class).show(FlowView.STRESS));
            FlowPageTest.settle(window);
            LooksTest.picture(window, "flow-picked");
            List<Curve> more = new ArrayList<>();
            for (int i = 2; i < 6; i++) {
                more.add(InventedCurves.curve("replicate " + i + " up", "up", InventedCurves.UP, 25, 10 + i));
            }
            FlowPageTest.add(window, more);
            LooksTest.size(window, LooksTest.SMALL);
            LooksTest.picture(window, "flow-replicates-small");
            assertTrue(window.on(() -> window.find(Table.class, "models").isVisible()));
        });
    }

    @Test
    void noTextIsCutAndNothingIsScrolledSideways() throws Exception {
        OpenWindow.use(LooksTest.DEMO, window -> {
            FlowPageTest.turnTo(window, Page.FLOW_CURVE);
            for (Point size : List.of(LooksTest.NORMAL, LooksTest.SMALL)) {
                LooksTest.size(window, size);
                FlowPageTest.settle(window);
                look(window, size);
            }
            FlowPageTest.add(window, InventedCurves.ramps());
            for (Point size : List.of(LooksTest.NORMAL, LooksTest.SMALL)) {
                LooksTest.size(window, size);
                FlowPageTest.settle(window);
                look(window, size);
            }
        });
    }

    private static void look(OpenWindow window, Point size) throws Exception {
        assertEquals(List.of(), window.on(() -> LooksTest.cut(window)), "cut at " + size);
        assertEquals(List.of(), window.on(() -> LooksTest.overlapping(window)), "overlapping at " + size);
        window.run(() -> {
            for (Composite composite : window.all(Composite.class, Composite::isVisible)) {
                ScrollBar bar = composite.getHorizontalBar();
                assertFalse(bar != null && bar.isVisible() && bar.getThumb() < bar.getMaximum() - bar.getMinimum(),
                        () -> composite + " must be scrolled at " + size);
            }
            Table models = window.find(Table.class, "models");
            int width = List.of(models.getColumns()).stream().mapToInt(TableColumn::getWidth).sum();
            assertTrue(!models.isVisible() || width <= models.getClientArea().width, "the columns are wider than the table at " + size);
        });
    }

    @Test
    void everyControlHasAName() throws Exception {
        OpenWindow.use(LooksTest.DEMO, window -> {
            FlowPageTest.add(window, InventedCurves.ramps());
            window.run(() -> {
                for (Control control : window.all(Control.class, c -> c.isVisible() && LooksTest.takesKeys(c))) {
                    String name = Names.of(control) == null ? LooksTest.words(control) : Names.of(control);
                    assertFalse(name.isBlank(), () -> control + " has no name");
                }
            });
        });
    }

    @Test
    void theImportHasNamesAndCutsNoWords() throws Exception {
        OpenWindow.use(LooksTest.DEMO, window -> {
            Path file = Files.createTempDirectory("broth").resolve("broth.csv");
            Files.writeString(file, ImportTest.rheometer());
            LooksTest.size(window, LooksTest.NORMAL);
            ImportWindow dialog = ImportTest.open(window, file);
            dialog.picture("import-preview");
            dialog.choose("unit of Viscosity", "Pa s");
            dialog.picture("import-slip");
            window.run(() -> {
                for (Control control : dialog.all(Control.class).stream().filter(c -> c.isVisible() && LooksTest.takesKeys(c)).toList()) {
                    String name = Names.of(control) == null ? LooksTest.words(control) : Names.of(control);
                    assertFalse(name.isBlank() && !(control.getClass().getSimpleName().equals("Link")), () -> control + " has no name");
                }
            });
            assertEquals(List.of(), window.on(() -> LooksTest.cut(dialog.all(Control.class))));
            dialog.press("Cancel");
            dialog.awaitEnd();
            Files.delete(file);
        });
    }
}
