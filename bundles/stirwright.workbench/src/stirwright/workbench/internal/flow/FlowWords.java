package stirwright.workbench.internal.flow;

import org.eclipse.osgi.util.NLS;

/** The words of the flow-curve page. They stand in FlowWords.properties or its translation. */
final class FlowWords extends NLS {
    public static String About_dropped;
    public static String About_fit;
    public static String About_inUse;
    public static String About_of;
    public static String About_ramps;
    public static String About_rates;
    public static String About_readAs;
    public static String About_sources;
    public static String About_temperature;
    public static String About_yield;
    public static String Axis_rate;
    public static String Axis_residual;
    public static String Axis_stress;
    public static String Axis_viscosity;
    public static String Band_measured;
    public static String Edit_pick;
    public static String Edit_remove;
    public static String Edit_setAside;
    public static String Edit_take;
    public static String Edit_takeOne;
    public static String Edit_use;
    public static String Fit_alike;
    public static String Fit_mixedRamps;
    public static String Fit_mixedTemperatures;
    public static String Fit_noneUsed;
    public static String Fit_notAboveZero;
    public static String Fit_points;
    public static String Fit_robust;
    public static String Fit_tooFew;
    public static String Fit_weighting;
    public static String Interval;
    public static String Interval_open;
    public static String Law_common;
    public static String Law_energy;
    public static String Law_range;
    public static String Law_twoTemperatures;
    public static String Parameter;
    public static String Parameter_heading;
    public static String Parameter_inUse;
    public static String Parameter_interval;
    public static String Parameter_joint;
    public static String Parameter_none;
    public static String Ramps_apart;
    public static String Ramps_area;
    public static String Ramps_outside;
    public static String Ramps_ratio;
    public static String Rate_above;
    public static String Rate_below;
    public static String Rate_impeller;
    public static String Rate_inside;
    public static String Rate_line;
    public static String Rate_outside;
    public static String Rate_powerBased;
    public static String Rate_unknown;
    public static String Residuals_none;
    public static String Row_delta;
    public static String Row_inUse;
    public static String Row_inUseNote;
    public static String Row_least;
    public static String Row_noFit;
    public static String Row_rms;
    public static String Row_warnings;
    public static String Row_why;
    public static String Source_block;
    public static String Source_curve;
    public static String Source_file;
    public static String Target_all;
    public static String Target_atTemperature;
    public static String Target_down;
    public static String Target_noRamp;
    public static String Target_one;
    public static String Target_unknownTemperature;
    public static String Target_up;
    public static String Temperature;
    public static String Temperature_unknown;
    public static String View_residuals;
    public static String View_stress;
    public static String View_viscosity;
    public static String Yield_leftOut;
    public static String Yield_range;
    public static String Yield_rangeStatic;
    public static String Yield_source;
    public static String Yield_static;
    public static String Yield_staticAlone;

    static {
        NLS.initializeMessages(FlowWords.class.getName(), FlowWords.class);
    }

    private FlowWords() {}
}
