package stirwright.conformance;

import java.util.ArrayList;
import java.util.List;
import stirwright.conformance.internal.Examination;

/** One check of the suite. */
public final class Check {
    private final String name;
    private final String proves;
    private final Examination examination;

    Check(String name, String proves, Examination examination) {
        this.name = name;
        this.proves = proves;
        this.examination = examination;
    }

    /** Short, in lower case, unique in the suite. */
    public String name() {
        return name;
    }

    /** What holds when the check finds nothing, in one sentence. */
    public String proves() {
        return proves;
    }

    /** Everything that stands against it, in the order of the contribution; empty when it holds. */
    public List<Finding> examine(Subject subject) {
        List<Finding> findings = new ArrayList<>();
        examination.examine(subject.workpiece(), (about, message) -> findings.add(new Finding(about, name, message)));
        return List.copyOf(findings);
    }

    @Override
    public String toString() {
        return name;
    }
}
