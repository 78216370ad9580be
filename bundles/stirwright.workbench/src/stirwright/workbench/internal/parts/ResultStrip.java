package stirwright.workbench.internal.parts;

import java.util.ArrayList;
import java.util.List;
import org.eclipse.swt.SWT;
import org.eclipse.swt.layout.GridData;
import org.eclipse.swt.layout.GridLayout;
import org.eclipse.swt.widgets.Composite;
import stirwright.core.CandidateResult;
import stirwright.core.Catalogue;
import stirwright.core.Entry;
import stirwright.core.FluidState;
import stirwright.correlation.Figures;
import stirwright.correlation.FlowKind;
import stirwright.correlation.Quantity;
import stirwright.correlation.Regime;
import stirwright.workbench.internal.Messages;
import stirwright.workbench.internal.session.Outcome;
import stirwright.workbench.internal.session.Sheet;
import stirwright.workbench.internal.widgets.FittedLabel;
import stirwright.workbench.internal.widgets.Looks;

/** What the pick gives, in one line of figures, with the caution that belongs to power and torque, and why it is flagged. */
final class ResultStrip extends Composite {
    private static final double MINUTE = 60;

    private final List<FittedLabel> values = new ArrayList<>();
    private final List<FittedLabel> remarks = new ArrayList<>();
    private final List<FittedLabel> doubts = new ArrayList<>();
    private final FittedLabel flag;
    private final Looks looks;

    /** A figure and, in small words, what stands behind it and what speaks against it. */
    private record Item(String value, String remark, Doubt doubt) {
        private static final Item NONE = new Item("", "");

        Item(String value, String remark) {
            this(value, remark, Doubt.NONE);
        }
    }

    ResultStrip(Composite parent, Looks looks) {
        super(parent, SWT.NONE);
        this.looks = looks;
        looks.onPage(this);
        setBackgroundMode(SWT.INHERIT_FORCE);
        List<String> captions = List.of(Messages.Strip_power, Messages.Strip_torque, Messages.Strip_powerPerVolume,
                Messages.Strip_speed, Messages.Strip_reynolds, Messages.Strip_shearRate, Messages.Strip_viscosity,
                Messages.Strip_pumping);
        GridLayout layout = new GridLayout(captions.size(), true);
        layout.marginWidth = 0;
        layout.marginHeight = 0;
        layout.verticalSpacing = 0;
        layout.horizontalSpacing = Looks.STEP;
        setLayout(layout);
        captions.forEach(c -> small(1).setText(c));
        captions.forEach(c -> values.add(figure()));
        captions.forEach(c -> remarks.add(small(1)));
        captions.forEach(c -> doubts.add(small(1)));
        FittedLabel caution = small(captions.size());
        caution.label().setForeground(looks.palette().near());
        caution.setText(Messages.Strip_caution);
        flag = small(captions.size());
        flag.label().setForeground(looks.palette().near());
    }

    private FittedLabel small(int columns) {
        FittedLabel label = new FittedLabel(this, looks);
        label.label().setFont(looks.small());
        label.label().setForeground(looks.palette().quiet());
        return cell(label, columns);
    }

    private FittedLabel figure() {
        FittedLabel label = new FittedLabel(this, looks);
        label.label().setFont(looks.strong());
        return cell(label, 1);
    }

    private static FittedLabel cell(FittedLabel label, int columns) {
        GridData data = new GridData(SWT.FILL, SWT.TOP, true, false, columns, 1);
        data.widthHint = 16 * Looks.STEP;
        label.label().setLayoutData(data);
        return label;
    }

    void show(Outcome outcome) {
        Sheet sheet = outcome.main();
        List<Item> items = sheet.result().pick().filter(p -> p.state().isPresent()).map(p -> items(sheet, p, outcome.catalogue())).orElse(List.of());
        for (int i = 0; i < values.size(); i++) {
            Item item = i < items.size() ? items.get(i) : Item.NONE;
            values.get(i).setText(item.value(), item.doubt().reason());
            values.get(i).label().setForeground(item.doubt().none() ? looks.palette().text() : looks.palette().quiet());
            remarks.get(i).setText(item.remark(), item.doubt().reason());
            doubts.get(i).setText(item.doubt().word(), item.doubt().reason());
            doubts.get(i).label().setForeground(item.doubt().colour(looks.palette()));
        }
        boolean doubt = items.stream().anyMatch(item -> !item.doubt().none());
        doubts.forEach(label -> shown(label, doubt));
        List<String> flags = outcome.words().of(sheet.result().flags());
        flag.setText(flags.isEmpty() ? "" : Messages.bind(flags.size() == 1 ? Messages.Strip_flag : Messages.Strip_flags,
                String.join("; ", flags), flags.size()));
        shown(flag, !flags.isEmpty());
    }

    private static void shown(FittedLabel label, boolean wanted) {
        GridData data = (GridData) label.label().getLayoutData();
        if (data.exclude == wanted) {
            data.exclude = !wanted;
            label.label().setVisible(wanted);
            label.label().requestLayout();
        }
    }

    private static List<Item> items(Sheet sheet, CandidateResult pick, Catalogue installed) {
        FluidState state = pick.state().orElseThrow();
        Doubt power = Doubt.of(pick, sheet.catalogue(installed).entry(pick.correlation()).map(Entry::correlation));
        return List.of(
                new Item(shown(pick.power(), "W"), "Np " + Figures.show(pick.powerNumber()), power),
                new Item(shown(pick.torque(), "N m"), "", power),
                new Item(shown(pick.powerPerVolume(), "W/m³"), "", power),
                new Item(shown(MINUTE * state.speed(), "rev/min"),
                        Messages.bind(Messages.Strip_tipSpeed, Figures.show(state.tipSpeed()))),
                new Item(Figures.show(state.reynolds()), pick.regime().map(ResultStrip::regime).orElse("")),
                new Item(shown(state.shearRate(), "1/s"),
                        Messages.bind(Messages.Strip_perRevolution, Figures.show(state.shearRateConstant())),
                        Doubt.of(sheet.result(), Quantity.SHEAR_RATE_CONSTANT, pick.shearRateCorrelation())),
                new Item(shown(state.viscosity(), "Pa s"), Messages.Strip_atShearRate),
                Double.isNaN(pick.pumping()) ? new Item("", Messages.Strip_noneKnown)
                        : new Item(shown(pick.pumping(), "m³/s"), pick.flowKind().map(ResultStrip::kind).orElse(""),
                                Doubt.of(sheet.result(), Quantity.FLOW_NUMBER, pick.flowCorrelation())));
    }

    private static String shown(double value, String unit) {
        return Double.isNaN(value) ? "" : Figures.show(value) + " " + unit;
    }

    private static String regime(Regime regime) {
        return switch (regime) {
            case LAMINAR -> Messages.Regime_laminar;
            case TRANSITIONAL -> Messages.Regime_transitional;
            case TURBULENT -> Messages.Regime_turbulent;
        };
    }

    private static String kind(FlowKind kind) {
        return kind == FlowKind.DISCHARGE ? Messages.Strip_discharge : Messages.Strip_circulation;
    }
}
