package stirwright.workbench.internal.importing;

import org.eclipse.osgi.util.NLS;

/** The words of the import of flow curves. They stand in ImportWords.properties or its translation. */
final class ImportWords extends NLS {
    public static String Blocks_block;
    public static String Blocks_is;
    public static String Blocks_name;
    public static String Blocks_points;
    public static String Blocks_reason;
    public static String Blocks_use;
    public static String Blocks_useName;
    public static String Choose_title;
    public static String Clipboard;
    public static String Clipboard_empty;
    public static String Column_not;
    public static String Column_notRead;
    public static String Column_number;
    public static String Column_quantity;
    public static String Column_tip;
    public static String Column_unit;
    public static String Columns_heading;
    public static String Dialog_cancel;
    public static String Dialog_take;
    public static String Dialog_takeOne;
    public static String Dialog_title;
    public static String Dropped_line;
    public static String Dropped_more;
    public static String Found_as;
    public static String Found_detect;
    public static String Found_heading;
    public static String Messages_name;
    public static String No_fluid;
    public static String Points_block;
    public static String Points_blockLeft;
    public static String Points_droppedOnly;
    public static String Points_heading;
    public static String Points_name;
    public static String Points_rate;
    public static String Points_reason;
    public static String Points_stress;
    public static String Points_temperature;
    public static String Points_viscosity;
    public static String Progress_again;
    public static String Progress_reading;
    public static String Progress_stop;
    public static String Progress_stopped;
    public static String Raw_heading;
    public static String Raw_line;
    public static String Raw_name;
    public static String Template;
    public static String Template_applied;
    public static String Template_apply;
    public static String Template_detect;
    public static String Template_detectTip;
    public static String Template_name;
    public static String Template_remove;
    public static String Template_removed;
    public static String Template_save;
    public static String Template_saved;
    public static String Template_tip;
    public static String Weight_problem;
    public static String Weight_warning;

    static {
        NLS.initializeMessages(ImportWords.class.getName(), ImportWords.class);
    }

    private ImportWords() {}
}
