package stirwright.exchange.internal.write;

import com.fasterxml.jackson.core.JsonFactory;
import com.fasterxml.jackson.core.JsonGenerator;
import com.fasterxml.jackson.core.util.DefaultIndenter;
import com.fasterxml.jackson.core.util.DefaultPrettyPrinter;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.io.Writer;
import stirwright.exchange.Origin;
import stirwright.exchange.Output;

/** One JSON object: where the results come from, and an array of them. */
public final class JsonOutput<T> implements Output<T> {
    private final JsonGenerator json;
    private final Writer out;
    private final Item<T> item;

    /** Writes one element of the array, or several. */
    @FunctionalInterface
    public interface Item<T> {
        void write(T value, JsonGenerator json) throws IOException;
    }

    /** @param array the name of the array */
    public JsonOutput(Writer out, Origin origin, String array, Item<T> item) {
        this.out = out;
        this.item = item;
        try {
            json = new JsonFactory().createGenerator(out);
            json.configure(JsonGenerator.Feature.AUTO_CLOSE_TARGET, false);
            json.setPrettyPrinter(new DefaultPrettyPrinter().withObjectIndenter(new DefaultIndenter("  ", "\n")));
            json.writeStartObject();
            json.writeStringField("stirwright", origin.version());
            if (!origin.file().isEmpty()) {
                json.writeStringField("file", origin.file());
            }
            json.writeArrayFieldStart(array);
        } catch (IOException failure) {
            throw new UncheckedIOException(failure);
        }
    }

    @Override
    public void add(T value) {
        try {
            item.write(value, json);
        } catch (IOException failure) {
            throw new UncheckedIOException(failure);
        }
    }

    @Override
    public void finish() {
        try {
            json.writeEndArray();
            json.writeEndObject();
            json.writeRaw('\n');
            json.flush();
            out.flush();
        } catch (IOException failure) {
            throw new UncheckedIOException(failure);
        }
    }

    @Override
    public void close() {
        // The writer belongs to whoever handed it over; an unfinished object stays as it is.
    }
}
