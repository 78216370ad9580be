package stirwright.console.internal;

import java.io.PrintWriter;
import java.nio.file.Path;
import java.util.Locale;
import stirwright.trust.Approval;
import stirwright.trust.DropIn;
import stirwright.trust.DropIns;

/** The approved bundles, and those in the folder. */
record TrustView(PrintWriter out) {

    void print(DropIns dropIns, Path userFolder) {
        StringBuilder text = new StringBuilder();
        text.append("approved by you, kept in ").append(userFolder).append('\n');
        Columns approved = new Columns("ll");
        for (Approval approval : dropIns.approved()) {
            approved.add(approval.date().toString(), approval.bundle()).under("SHA-256 " + approval.sha256());
        }
        finish(text, approved, dropIns.approved().isEmpty());
        text.append("in ").append(dropIns.folder()).append('\n');
        Columns present = new Columns("lll");
        for (DropIn dropIn : dropIns.list()) {
            present.add(dropIn.state().name().toLowerCase(Locale.ROOT), dropIn.file().getFileName().toString(), dropIn.bundle());
            if (!dropIn.message().isEmpty()) {
                present.under(dropIn.message());
            }
            if (!dropIn.sha256().isEmpty()) {
                present.under("SHA-256 " + dropIn.sha256());
            }
        }
        finish(text, present, dropIns.list().isEmpty());
        out.print(Plain.text(text));
        out.flush();
    }

    private static void finish(StringBuilder text, Columns columns, boolean empty) {
        if (empty) {
            text.append("  nothing\n");
        }
        columns.appendTo(text, "  ", CaseView.WIDTH);
    }
}
