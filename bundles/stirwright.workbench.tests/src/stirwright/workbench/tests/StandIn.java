package stirwright.workbench.tests;

import java.util.List;
import java.util.Map;
import org.eclipse.core.runtime.IConfigurationElement;
import org.eclipse.core.runtime.Platform;
import org.eclipse.equinox.app.IApplicationContext;
import org.osgi.framework.Bundle;

/** What the platform would hand to the application, with the properties that the product really declares. */
final class StandIn implements IApplicationContext {
    private static final String PRODUCTS = "org.eclipse.core.runtime.products";

    private final List<String> arguments;

    StandIn(List<String> arguments) {
        this.arguments = arguments;
    }

    @Override
    public Map<?, ?> getArguments() {
        return Map.of(APPLICATION_ARGS, arguments.toArray(String[]::new));
    }

    @Override
    public String getBrandingProperty(String key) {
        for (IConfigurationElement product : Platform.getExtensionRegistry().getConfigurationElementsFor(PRODUCTS)) {
            for (IConfigurationElement property : product.getChildren("property")) {
                if (property.getContributor().getName().equals("stirwright.workbench") && key.equals(property.getAttribute("name"))) {
                    return property.getAttribute("value");
                }
            }
        }
        return null;
    }

    @Override
    public void applicationRunning() {
        // Nobody shows a splash screen.
    }

    @Override
    public String getBrandingApplication() {
        return "org.eclipse.e4.ui.workbench.swt.E4Application";
    }

    @Override
    public String getBrandingName() {
        return "Stirwright";
    }

    @Override
    public String getBrandingDescription() {
        return "";
    }

    @Override
    public String getBrandingId() {
        return "stirwright.workbench.product";
    }

    @Override
    public Bundle getBrandingBundle() {
        return Platform.getBundle("stirwright.workbench");
    }

    @Override
    public void setResult(Object result, org.eclipse.equinox.app.IApplication application) {
        throw new IllegalStateException("the application ends at once");
    }
}
