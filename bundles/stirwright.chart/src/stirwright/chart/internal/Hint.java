package stirwright.chart.internal;

import org.eclipse.swt.graphics.Rectangle;

/**
 * A written text that may be shortened.
 *
 * @param area where it stands
 * @param full the whole text, shown when the pointer rests on it; empty when nothing was cut
 * @param curveId the curve that it names; empty for none
 */
public record Hint(Rectangle area, String full, String curveId) { }
