package stirwright.exchange.internal.table;

/** What stands between cells; listed by what decides when several occur in a header. */
public enum Separator {
    TAB('\t', "tab"),
    SEMICOLON(';', "semicolon"),
    COMMA(',', "comma");

    private final char sign;
    private final String word;

    Separator(char sign, String word) {
        this.sign = sign;
        this.word = word;
    }

    public char sign() {
        return sign;
    }

    public String word() {
        return word;
    }
}
