package stirwright.console.internal;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import org.junit.jupiter.api.Test;

class ColumnsTest {

    @Test
    void textGoesLeftNumbersRightAndNothingTrails() {
        StringBuilder text = new StringBuilder();
        new Columns("lrl").add("name", "W", "note").add("a", "12.5", "").under("why").appendTo(text, "  ", 80);
        assertEquals("  name     W  note\n  a     12.5\n        why\n", text.toString());
        assertThrows(IllegalArgumentException.class, () -> new Columns("l").add("one", "two"));
    }

    @Test
    void paragraphsBreakAtSpacesAndIndentFurther() {
        StringBuilder text = new StringBuilder();
        Columns.appendWrapped(text, "  ", "one two three", 10);
        assertEquals("  one two\n    three\n", text.toString());
    }

    @Test
    void aWordThatIsTooLongStandsAlone() {
        StringBuilder text = new StringBuilder();
        Columns.appendWrapped(text, "", "a verylongword b", 6);
        assertEquals("a\n  verylongword\n  b\n", text.toString());
    }
}
