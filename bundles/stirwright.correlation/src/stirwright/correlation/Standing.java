package stirwright.correlation;

/** Who stands behind a correlation. Only some standings may be recommended. */
public enum Standing {
    PUBLISHED("published", true),
    SUPPLIER_STATED("supplier-stated", true),
    IN_HOUSE_DRAFT("in-house draft", false),
    CHECKED("checked", false),
    APPROVED("approved", true),
    RETIRED("retired", false);

    private final String words;
    private final boolean recommendable;

    Standing(String words, boolean recommendable) {
        this.words = words;
        this.recommendable = recommendable;
    }

    public String words() {
        return words;
    }

    public boolean recommendable() {
        return recommendable;
    }
}
