package stirwright.workbench.internal.handlers;

import org.eclipse.core.runtime.Platform;
import org.eclipse.jface.dialogs.MessageDialog;
import org.eclipse.swt.widgets.Shell;
import org.osgi.framework.Version;
import stirwright.workbench.internal.Messages;

/** Says what this is, who answers for what, and which keys there are. */
final class About {

    private About() {}

    static void show(Shell shell) {
        Version version = Platform.getBundle("stirwright.workbench").getVersion();
        MessageDialog.openInformation(shell, Messages.About_title, Messages.bind(Messages.About_words,
                version.getMajor() + "." + version.getMinor() + "." + version.getMicro()));
    }
}
