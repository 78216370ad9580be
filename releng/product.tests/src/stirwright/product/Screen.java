package stirwright.product;

import com.sun.jna.NativeLong;
import com.sun.jna.platform.unix.X11;
import com.sun.jna.platform.unix.X11.Atom;
import com.sun.jna.platform.unix.X11.Display;
import com.sun.jna.platform.unix.X11.Window;
import com.sun.jna.platform.unix.X11.WindowByReference;
import com.sun.jna.platform.unix.X11.XClientMessageEvent;
import com.sun.jna.platform.unix.X11.XErrorHandler;
import com.sun.jna.platform.unix.X11.XEvent;
import com.sun.jna.platform.unix.X11.XWindowAttributes;
import com.sun.jna.ptr.IntByReference;
import com.sun.jna.ptr.PointerByReference;
import java.io.BufferedReader;
import java.io.IOException;
import java.util.Optional;

/** A display that nobody sees, and what a person's window manager would do on it: find a window and ask it to close. */
final class Screen implements AutoCloseable {
    /** Windows come and go while they are asked; the library would end the process over it. Kept from collection here. */
    private static final XErrorHandler IGNORE = (display, event) -> 0;

    private final Process server;
    private final String name;
    private final Display display;

    private Screen(Process server, String name, Display display) {
        this.server = server;
        this.name = name;
        this.display = display;
    }

    /** Empty when the machine has no Xvfb. */
    static Optional<Screen> open() throws IOException {
        Process server;
        try {
            server = new ProcessBuilder("Xvfb", "-displayfd", "1", "-noreset", "-screen", "0", "1280x800x24")
                    .redirectError(ProcessBuilder.Redirect.DISCARD).start();
        } catch (IOException notInstalled) {
            return Optional.empty();
        }
        BufferedReader reader = server.inputReader();
        String name = ":" + reader.readLine();
        X11.INSTANCE.XSetErrorHandler(IGNORE);
        Display display = X11.INSTANCE.XOpenDisplay(name);
        if (display == null) {
            server.destroy();
            throw new IOException("Xvfb gave the display " + name + ", which cannot be opened");
        }
        return Optional.of(new Screen(server, name, display));
    }

    String name() {
        return name;
    }

    /** A window that can be seen and whose title starts with {@code title}; waits for it while {@code owner} lives. */
    Window await(String title, Process owner) throws IOException, InterruptedException {
        long end = System.nanoTime() + 60_000_000_000L;
        while (System.nanoTime() < end && owner.isAlive()) {
            Optional<Window> found = find(title, X11.INSTANCE.XDefaultRootWindow(display));
            if (found.isPresent()) {
                return found.get();
            }
            Thread.sleep(50);
        }
        throw new IOException("no window " + title + " came up; its process " + (owner.isAlive() ? "lives" : "ended"));
    }

    private Optional<Window> find(String title, Window window) {
        PointerByReference text = new PointerByReference();
        XWindowAttributes attributes = new XWindowAttributes();
        if (X11.INSTANCE.XFetchName(display, window, text) != 0 && text.getValue() != null
                && text.getValue().getString(0).startsWith(title)
                && X11.INSTANCE.XGetWindowAttributes(display, window, attributes) != 0
                && attributes.map_state == X11.IsViewable) {
            return Optional.of(window);
        }
        WindowByReference root = new WindowByReference();
        WindowByReference parent = new WindowByReference();
        PointerByReference children = new PointerByReference();
        IntByReference count = new IntByReference();
        if (X11.INSTANCE.XQueryTree(display, window, root, parent, children, count) == 0 || count.getValue() == 0) {
            return Optional.empty();
        }
        for (long id : children.getValue().getLongArray(0, count.getValue())) {
            Optional<Window> found = find(title, new Window(id));
            if (found.isPresent()) {
                return found;
            }
        }
        return Optional.empty();
    }

    /** Does what the cross in a window's corner does. */
    void close(Window window) {
        Atom protocols = X11.INSTANCE.XInternAtom(display, "WM_PROTOCOLS", false);
        Atom delete = X11.INSTANCE.XInternAtom(display, "WM_DELETE_WINDOW", false);
        XEvent event = new XEvent();
        event.setType(XClientMessageEvent.class);
        event.xclient.type = X11.ClientMessage;
        event.xclient.display = display;
        event.xclient.window = window;
        event.xclient.message_type = protocols;
        event.xclient.format = 32;
        event.xclient.data.setType(NativeLong[].class);
        event.xclient.data.l[0] = new NativeLong(delete.longValue());
        X11.INSTANCE.XSendEvent(display, window, 0, new NativeLong(X11.NoEventMask), event);
        X11.INSTANCE.XFlush(display);
    }

    @Override
    public void close() {
        X11.INSTANCE.XCloseDisplay(display);
        server.destroy();
    }
}
