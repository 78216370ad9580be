package stirwright.workbench.internal.session;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.CancellationException;
import java.util.function.BooleanSupplier;
import stirwright.core.CaseResult;
import stirwright.core.CrossCheck;
import stirwright.core.OpenCase;
import stirwright.correlation.Family;
import stirwright.exchange.CaseEntry;

/** Computes all that the window shows, by the same calls as the command line. */
final class Calculation {
    private final Request request;
    private final CrossCheck crossCheck;
    private final BooleanSupplier stale;

    private Calculation(Request request, BooleanSupplier stale) {
        this.request = request;
        this.crossCheck = new CrossCheck(request.catalogue());
        this.stale = stale;
    }

    /**
     * @param stale asked now and then; once it says yes, the work is given up
     * @throws CancellationException when it was given up
     */
    static Outcome of(Request request, BooleanSupplier stale) {
        return new Calculation(request, stale).outcome();
    }

    private Outcome outcome() {
        List<Sheet> sheets = new ArrayList<>();
        for (Request.Entry entry : request.entries()) {
            Stale.check(stale);
            sheets.add(sheet(entry));
        }
        List<Row> rows = Rows.of(request.catalogue(), request.view().quantity(), sheets);
        Words words = new Words(request.catalogue());
        return new Outcome(request.catalogue(), words, request.view(), sheets, rows,
                Pictures.of(request.catalogue(), words, request.view(), sheets, rows, stale));
    }

    private Sheet sheet(Request.Entry entry) {
        CaseEntry input = entry.input();
        Optional<OpenCase> open = input.spec().map(crossCheck::open);
        CaseResult result = open.map(OpenCase::result).map(input::asTyped).orElseGet(() -> input.check(crossCheck));
        String title = request.catalogue().family(entry.familyId()).map(Family::title).orElse(entry.familyId());
        return new Sheet(entry.familyId(), title, result, input.spec(), open);
    }
}
