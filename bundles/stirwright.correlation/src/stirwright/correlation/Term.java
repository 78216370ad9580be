package stirwright.correlation;

import java.util.Objects;
import java.util.regex.Pattern;

/** A word of the contract: an id that machines compare and a title that people read. */
public abstract sealed class Term
        permits Quantity, Variable, Effect, ReynoldsDefinition, Measure, Classifier, GeometryParameter {

    private static final Pattern ID = Pattern.compile("[a-z][a-z0-9]*([-_.][a-z0-9]+)*");

    private final String id;
    private final String title;

    Term(String id, String title) {
        if (!ID.matcher(id).matches()) {
            throw new ContractException(
                    "id '" + id + "': expected lower-case words joined by '-', '_' or '.'");
        }
        // Interned, so that equal ids are one object and comparing terms costs nothing in loops.
        this.id = id.intern();
        this.title = Objects.requireNonNull(title, "title");
    }

    /** The id; equal ids mean the same thing whichever bundle wrote them. */
    public final String id() {
        return id;
    }

    /** The name that people read, in lower case so that it stands in a sentence. */
    public final String title() {
        return title;
    }

    @Override
    public final boolean equals(Object other) {
        return this == other || other instanceof Term term && id == term.id && getClass() == term.getClass();
    }

    @Override
    public final int hashCode() {
        return id.hashCode();
    }

    @Override
    public final String toString() {
        return id;
    }
}
