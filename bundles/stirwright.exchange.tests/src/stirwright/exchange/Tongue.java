package stirwright.exchange;

import java.math.BigDecimal;
import java.util.List;

/** The words and the decimal sign of the country that a file was written in. */
enum Tongue {
    ENGLISH('.', List.of("Shear Rate", "Shear Stress", "Viscosity", "Temperature", "Time", "Torque", "Speed", "Status", "Point",
            "Segment Pt", "Interval", "Up", "Down", "Sample")),
    GERMAN(',', List.of("Scherrate", "Schubspannung", "Viskosit\u00E4t", "Temperatur", "Zeit", "Drehmoment", "Drehzahl", "Zustand",
            "Punkt", "Abschnitt Punkt", "Intervall", "Auf", "Ab", "Probe"));

    static final int RATE = 0;
    static final int STRESS = 1;
    static final int VISCOSITY = 2;
    static final int TEMPERATURE = 3;
    static final int TIME = 4;
    static final int TORQUE = 5;
    static final int SPEED = 6;
    static final int STATUS = 7;
    static final int POINT = 8;
    static final int JOINED = 9;
    static final int INTERVAL = 10;
    static final int UP = 11;
    static final int DOWN = 12;
    static final int SAMPLE = 13;

    private final char sign;
    private final List<String> words;

    Tongue(char sign, List<String> words) {
        this.sign = sign;
        this.words = words;
    }

    String word(int which) {
        return words.get(which);
    }

    String number(BigDecimal value) {
        return value.stripTrailingZeros().toPlainString().replace('.', sign);
    }

    boolean comma() {
        return sign == ',';
    }
}
