package stirwright.exchange;

/** What stands between the cells of a text; of equals the first one is taken. */
public enum CurveSeparator {
    TAB("tab"),
    SEMICOLON("semicolon"),
    COMMA("comma"),
    BAR("vertical bar"),
    /** One or more; two or more where the text has other words with single spaces. */
    SPACES("spaces");

    private final String word;

    CurveSeparator(String word) {
        this.word = word;
    }

    public String word() {
        return word;
    }
}
