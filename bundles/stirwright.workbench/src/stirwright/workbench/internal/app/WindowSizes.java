package stirwright.workbench.internal.app;

import java.util.Properties;
import org.eclipse.e4.ui.model.application.ui.MElementContainer;
import org.eclipse.e4.ui.model.application.ui.MUIElement;
import org.eclipse.e4.ui.model.application.ui.basic.MPartSashContainer;
import org.eclipse.e4.ui.model.application.ui.basic.MWindow;
import org.eclipse.e4.ui.workbench.modeling.EModelService;
import org.eclipse.swt.graphics.Rectangle;
import org.eclipse.swt.widgets.Display;
import org.eclipse.swt.widgets.Monitor;

/** The window's place and the sizes of its zones, from one start to the next. */
final class WindowSizes {
    private static final String ZONE = "zone.";

    private WindowSizes() {}

    static void note(EModelService models, MWindow window) {
        Settings.change(settings -> {
            settings.setProperty("x", String.valueOf(window.getX()));
            settings.setProperty("y", String.valueOf(window.getY()));
            settings.setProperty("width", String.valueOf(window.getWidth()));
            settings.setProperty("height", String.valueOf(window.getHeight()));
            for (MPartSashContainer sash : models.findElements(window, null, MPartSashContainer.class)) {
                for (MUIElement zone : ((MElementContainer<?>) sash).getChildren()) {
                    if (zone.getContainerData() != null) {
                        settings.setProperty(ZONE + zone.getElementId(), zone.getContainerData());
                    }
                }
            }
        });
    }

    /** Before the window is drawn; what does not fit on any screen is left. */
    static void restore(EModelService models, MWindow window) {
        Properties settings = Settings.read();
        Rectangle place = new Rectangle(number(settings, "x"), number(settings, "y"), number(settings, "width"),
                number(settings, "height"));
        if (place.width > 0 && place.height > 0 && onScreen(place)) {
            window.setX(place.x);
            window.setY(place.y);
            window.setWidth(place.width);
            window.setHeight(place.height);
        }
        for (MPartSashContainer sash : models.findElements(window, null, MPartSashContainer.class)) {
            for (MUIElement zone : ((MElementContainer<?>) sash).getChildren()) {
                int share = number(settings, ZONE + zone.getElementId());
                if (share > 0) {
                    zone.setContainerData(String.valueOf(share));
                }
            }
        }
    }

    private static boolean onScreen(Rectangle place) {
        for (Monitor monitor : Display.getCurrent().getMonitors()) {
            Rectangle screen = monitor.getClientArea();
            if (screen.contains(place.x, place.y) && screen.width >= place.width && screen.height >= place.height) {
                return true;
            }
        }
        return false;
    }

    private static int number(Properties settings, String key) {
        try {
            return Integer.parseInt(settings.getProperty(key, "-1"));
        } catch (NumberFormatException damaged) {
            return -1;
        }
    }
}
