package stirwright.workbench.internal.session;

import stirwright.workbench.internal.Messages;

/** What the window is about at the moment; the zones stay where they are and show what belongs to it. */
public enum Page {
    CASE,
    FLOW_CURVE;

    /** The word on the selector. */
    public String title() {
        return switch (this) {
            case CASE -> Messages.Page_case;
            case FLOW_CURVE -> Messages.Page_flowCurve;
        };
    }
}
