package stirwright.correlation;

/** Where a number comes from: the work, and the place in it where a reader finds the number. */
public final class Citation {

    /** The words that stand for a locator which nobody has looked up yet. */
    public static final String LOCATOR_NOT_AT_HAND = "locator not at hand";

    private static final Citation COMMON_PRACTICE = new Citation("common practice, no source", "");

    private final String work;
    private final String locator;

    private Citation(String work, String locator) {
        this.work = work;
        this.locator = locator;
    }

    /**
     * @param work authors, title or journal, volume, year
     * @param locator page, table, equation, figure or example
     */
    public static Citation of(String work, String locator) {
        if (work.isBlank() || locator.isBlank()) {
            throw new ContractException("a citation needs a work and a locator: '" + work + "', '" + locator + "'");
        }
        return new Citation(work, locator);
    }

    public static Citation withoutLocator(String work) {
        return of(work, LOCATOR_NOT_AT_HAND);
    }

    /** A rule of the trade. What rests on it is shown and never recommended. */
    public static Citation commonPractice() {
        return COMMON_PRACTICE;
    }

    public boolean hasSource() {
        return this != COMMON_PRACTICE;
    }

    public String work() {
        return work;
    }

    public String locator() {
        return locator;
    }

    @Override
    public String toString() {
        return locator.isEmpty() ? work : work + ", " + locator;
    }
}
