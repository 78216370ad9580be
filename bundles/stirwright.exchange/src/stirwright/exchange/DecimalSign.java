package stirwright.exchange;

/** The sign between the whole and the fractional digits of a number. */
public enum DecimalSign {
    POINT('.', "decimal point"),
    COMMA(',', "decimal comma");

    private final char sign;
    private final String words;

    DecimalSign(char sign, String words) {
        this.sign = sign;
        this.words = words;
    }

    public char sign() {
        return sign;
    }

    public String words() {
        return words;
    }

    /** The one that is not this. */
    public DecimalSign other() {
        return this == POINT ? COMMA : POINT;
    }
}
