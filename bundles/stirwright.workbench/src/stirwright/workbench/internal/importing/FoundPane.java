package stirwright.workbench.internal.importing;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.function.Consumer;
import java.util.function.Function;
import org.eclipse.swt.SWT;
import org.eclipse.swt.custom.ScrolledComposite;
import org.eclipse.swt.layout.FillLayout;
import org.eclipse.swt.layout.GridData;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Label;
import stirwright.exchange.CurveImport;
import stirwright.exchange.CurveSeparator;
import stirwright.exchange.DecimalSign;
import stirwright.exchange.Finding;
import stirwright.exchange.ImportChoice;
import stirwright.workbench.internal.Messages;
import stirwright.workbench.internal.widgets.Form;
import stirwright.workbench.internal.widgets.Looks;
import stirwright.workbench.internal.widgets.Names;

/** What was detected, why, and a control for each that overrules it. */
final class FoundPane extends Composite {
    private static final int LABEL_WIDTH = 24 * Looks.STEP;
    private static final List<String> ENCODINGS =
            List.of("UTF-8", "UTF-16LE", "UTF-16BE", "windows-1252", "ISO-8859-1", "ISO-8859-15", "windows-1250", "IBM850");

    private final Looks looks;
    private final ImportSession session;
    private final ScrolledComposite scroller;
    /** What the controls were made for; they are made anew only for something else, so that the focus stays. */
    private List<Object> shape = List.of();

    FoundPane(Composite parent, Looks looks, ImportSession session) {
        super(parent, SWT.NONE);
        this.looks = looks;
        this.session = session;
        setLayout(new FillLayout());
        scroller = looks.onPage(new ScrolledComposite(this, SWT.V_SCROLL));
        scroller.setExpandHorizontal(true);
        scroller.setExpandVertical(true);
        scroller.setShowFocusedControl(true);
        scroller.addListener(SWT.Resize, e -> fit());
    }

    void show() {
        CurveImport found = session.found().orElse(null);
        if (found == null) {
            return;
        }
        List<Object> now = List.of(found.findings(), session.choice(), ImportColumns.of(found));
        if (now.equals(shape)) {
            return;
        }
        shape = now;
        String focus = focused();
        int top = scroller.getOrigin().y;
        scroller.setRedraw(false);
        if (scroller.getContent() != null) {
            scroller.getContent().dispose();
        }
        Form form = new Form(scroller, looks, LABEL_WIDTH);
        build(form, found);
        scroller.setContent(form);
        fit();
        scroller.setOrigin(0, top);
        scroller.setRedraw(true);
        Arrays.stream(form.getChildren()).filter(c -> !focus.isEmpty() && focus.equals(Names.of(c))).findFirst().ifPresent(c -> c.setFocus());
    }

    private String focused() {
        return getDisplay().getFocusControl() != null && Names.of(getDisplay().getFocusControl()) != null
                ? Names.of(getDisplay().getFocusControl()) : "";
    }

    private void fit() {
        if (scroller.getContent() != null) {
            scroller.setMinSize(scroller.getContent().computeSize(scroller.getClientArea().width, SWT.DEFAULT));
        }
    }

    private void build(Form form, CurveImport found) {
        form.heading(ImportWords.Columns_heading);
        new ColumnControls(form, session).build(ImportColumns.of(found));
        form.heading(ImportWords.Found_heading);
        ImportChoice choice = session.choice();
        for (Finding finding : found.findings()) {
            switch (finding.topic()) {
                case ENCODING -> choice(form, finding, ENCODINGS, Function.identity(), choice.encoding(),
                        said -> session.choose(choice.withEncoding(said)));
                case SEPARATOR -> choice(form, finding, List.of(CurveSeparator.values()), CurveSeparator::word, choice.separator(),
                        said -> session.choose(choice.withSeparator(said)));
                case DECIMAL_SIGN -> choice(form, finding, List.of(DecimalSign.values()), DecimalSign::words, choice.decimalSign(),
                        said -> session.choose(choice.withDecimalSign(said)));
                case SHEETS -> choice(form, finding, sheets(found), Function.identity(), choice.sheets().stream().findFirst(),
                        said -> session.choose(choice.withSheets(said.map(List::of).orElse(List.of()))));
                case COLUMN, BLOCKS -> {
                    // Each has controls of its own.
                }
                default -> {
                    form.readOnly(capital(finding.topic().words()), finding.value());
                    reason(form, finding.reason());
                }
            }
        }
    }

    private static List<String> sheets(CurveImport found) {
        List<String> sheets = new ArrayList<>(found.choice().sheets());
        found.rows().stream().map(r -> r.sheet()).filter(s -> !s.isEmpty()).distinct().filter(s -> !sheets.contains(s)).forEach(sheets::add);
        return sheets;
    }

    /** The first word leaves it as found. */
    private <T> void choice(
            Form form, Finding finding, List<T> all, Function<T, String> words, Optional<T> said, Consumer<Optional<T>> chosen) {
        List<T> known = new ArrayList<>(all);
        said.filter(s -> !known.contains(s)).ifPresent(known::add);
        List<String> shown = new ArrayList<>();
        shown.add(said.isPresent() ? ImportWords.Found_detect : Messages.bind(ImportWords.Found_as, finding.value()));
        known.forEach(k -> shown.add(words.apply(k)));
        form.choice(capital(finding.topic().words()), shown, said.map(s -> known.indexOf(s) + 1).orElse(0),
                i -> chosen.accept(i == 0 ? Optional.empty() : Optional.of(known.get(i - 1))));
        reason(form, finding.reason());
    }

    private void reason(Form form, String words) {
        if (words.isBlank()) {
            return;
        }
        Label label = looks.quiet(form, SWT.WRAP, Looks.literal(words));
        label.setFont(looks.small());
        GridData data = Form.wholeLine();
        data.horizontalIndent = 4 * Looks.STEP;
        data.widthHint = 2 * LABEL_WIDTH;
        label.setLayoutData(data);
    }

    static String capital(String words) {
        return words.isEmpty() ? words : Character.toUpperCase(words.charAt(0)) + words.substring(1);
    }
}
