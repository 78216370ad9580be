package stirwright.core;

/** How a case came out, judged by its input and its pick alone. */
public enum Status {
    OK("ok"),
    FLAGGED("flagged"),
    REFUSED("refused");

    private final String id;

    Status(String id) {
        this.id = id;
    }

    public String id() {
        return id;
    }

    public Status worseOf(Status other) {
        return compareTo(other) >= 0 ? this : other;
    }
}
