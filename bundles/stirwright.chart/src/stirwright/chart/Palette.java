package stirwright.chart;

import org.eclipse.swt.graphics.Color;
import org.eclipse.swt.widgets.Display;

/**
 * The colours of a theme. They hold no resource of the system and need no disposal.
 *
 * @param isDark true for light text on a dark page
 * @param page behind everything
 * @param surface raised above the page
 * @param text text
 * @param quiet secondary text
 * @param hairline lines that recede
 * @param accent the pick, the focus, links
 * @param inside the verdict inside
 * @param near the verdict near
 * @param outside the verdict outside
 * @param notStated the verdict not stated
 */
public record Palette(boolean isDark, Color page, Color surface, Color text, Color quiet, Color hairline, Color accent,
        Color inside, Color near, Color outside, Color notStated) {
    private static final Palette LIGHT = new Palette(false, rgb(0xFBFAF8), rgb(0xFFFFFF), rgb(0x22262A), rgb(0x5B636B),
            rgb(0xDDD9D2), rgb(0x0B6E66), rgb(0x2F6B2F), rgb(0x8A5A00), rgb(0xA3262A), rgb(0x5B636B));
    private static final Palette DARK = new Palette(true, rgb(0x1E2124), rgb(0x272B2F), rgb(0xE8E6E1), rgb(0xA9B0B7),
            rgb(0x3A4046), rgb(0x4DB6AC), rgb(0x8CC58C), rgb(0xE0B050), rgb(0xF08A8D), rgb(0xA9B0B7));

    /** The light theme. */
    public static Palette light() {
        return LIGHT;
    }

    /** The dark theme. */
    public static Palette dark() {
        return DARK;
    }

    /** The theme that the system asks for. */
    public static Palette of(Display display) {
        return Display.isSystemDarkTheme() ? DARK : LIGHT;
    }

    static Color rgb(int hex) {
        return new Color(hex >> 16 & 0xFF, hex >> 8 & 0xFF, hex & 0xFF);
    }
}
