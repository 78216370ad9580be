package stirwright.exchange.internal.write;

import com.fasterxml.jackson.core.JsonGenerator;
import java.io.IOException;
import java.util.List;
import java.util.function.Function;

/** Rows of a table as JSON objects with the columns' names. */
public final class JsonRecords {

    private JsonRecords() {}

    /** Every row of an item as an object of its own. */
    public static <T, R> JsonOutput.Item<T> each(List<Column<R>> columns, Function<T, List<R>> rows) {
        return (item, json) -> {
            for (R row : rows.apply(item)) {
                write(row, columns, json);
            }
        };
    }

    static <R> void array(String name, List<R> rows, List<Column<R>> columns, JsonGenerator json) throws IOException {
        json.writeArrayFieldStart(name);
        for (R row : rows) {
            write(row, columns, json);
        }
        json.writeEndArray();
    }

    static <R> void write(R row, List<Column<R>> columns, JsonGenerator json) throws IOException {
        json.writeStartObject();
        for (Column<R> column : columns) {
            switch (column) {
                case Column.Text<R> text -> json.writeStringField(text.name(), text.of().apply(row));
                case Column.Number<R> number -> number(number.name(), number.of().applyAsDouble(row), json);
                case Column.Count<R> count -> count(count.name(), count.of().applyAsInt(row), json);
                case Column.Words<R> words -> words(words.name(), words.of().apply(row), json);
            }
        }
        json.writeEndObject();
    }

    static void number(String name, double value, JsonGenerator json) throws IOException {
        json.writeFieldName(name);
        if (Double.isFinite(value)) {
            json.writeNumber(value);
        } else {
            json.writeNull();
        }
    }

    private static void count(String name, int value, JsonGenerator json) throws IOException {
        json.writeFieldName(name);
        if (value < 0) {
            json.writeNull();
        } else {
            json.writeNumber(value);
        }
    }

    static void words(String name, List<String> words, JsonGenerator json) throws IOException {
        json.writeFieldName(name);
        json.writeArray(words.toArray(String[]::new), 0, words.size());
    }
}
