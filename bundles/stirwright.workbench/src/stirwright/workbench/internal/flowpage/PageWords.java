package stirwright.workbench.internal.flowpage;

import org.eclipse.osgi.util.NLS;

/** The words of the widgets of the flow-curve page. They stand in PageWords.properties or its translation. */
public final class PageWords extends NLS {
    public static String Card_name;
    public static String Card_pick;
    public static String Card_reason;
    public static String Card_reasonName;
    public static String Card_reasonTip;
    public static String Chart_name;
    public static String Column_curve;
    public static String Column_delta;
    public static String Column_deltaTip;
    public static String Column_model;
    public static String Column_parameters;
    public static String Column_parametersTip;
    public static String Column_rank;
    public static String Column_rms;
    public static String Column_rmsTip;
    public static String Column_warnings;
    public static String Column_warningsTip;
    public static String Curves_heading;
    public static String Curves_line;
    public static String Curves_name;
    public static String Curves_none;
    public static String Curves_remove;
    public static String Curves_removeTip;
    public static String Curves_temperature;
    public static String Empty_import;
    public static String Empty_noCase;
    public static String Empty_words;
    public static String Head_fitTo;
    public static String Head_import;
    public static String Head_robust;
    public static String Head_robustTip;
    public static String Head_views;
    public static String Head_whole;
    public static String Head_wholeTip;
    public static String Table_name;

    static {
        NLS.initializeMessages(PageWords.class.getName(), PageWords.class);
    }

    private PageWords() {}
}
