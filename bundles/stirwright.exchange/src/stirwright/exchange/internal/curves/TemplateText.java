package stirwright.exchange.internal.curves;

import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.function.Function;
import java.util.stream.Stream;
import stirwright.exchange.BlockChoice;
import stirwright.exchange.BlockUse;
import stirwright.exchange.ColumnChoice;
import stirwright.exchange.CurveQuantity;
import stirwright.exchange.CurveSeparator;
import stirwright.exchange.DecimalSign;
import stirwright.exchange.ImportChoice;
import stirwright.exchange.UnusableFileException;

/**
 * A choice as text: one line for each thing that is overruled, {@code key = value}; lists within a value have
 * {@code |} between them, and whatever is free text stands last.
 */
final class TemplateText {
    private static final String HEAD = "# What to overrule when flow curves are imported";
    private static final String NOT_READ = "not-read";
    private static final String AS_FOUND = "as-found";

    private TemplateText() {}

    static String write(ImportChoice choice) {
        StringBuilder text = new StringBuilder(HEAD).append('\n');
        choice.encoding().ifPresent(e -> line(text, "encoding", e));
        choice.separator().ifPresent(s -> line(text, "separator", word(s)));
        choice.decimalSign().ifPresent(d -> line(text, "decimal-sign", word(d)));
        choice.sheets().forEach(s -> line(text, "sheet", s));
        choice.columns().forEach(c -> line(text, "column", c.column() + "|"
                + c.quantity().map(TemplateText::word).orElse(NOT_READ) + "|" + c.unit().replace("|", " ") + "|" + c.sheet()));
        choice.blocks().forEach(b -> line(text, "block", b.block() + "|" + b.use().map(TemplateText::word).orElse(AS_FOUND)
                + "|" + b.taken().map(t -> t ? "taken" : "left").orElse(AS_FOUND)));
        return text.toString();
    }

    private static void line(StringBuilder text, String key, String value) {
        text.append(key).append(" = ").append(value.replaceAll("[\\r\\n]+", " ")).append('\n');
    }

    private static String word(Enum<?> constant) {
        return constant.name().toLowerCase(Locale.ROOT).replace('_', '-');
    }

    /** @throws UnusableFileException naming the line */
    static ImportChoice read(Object file, String text) {
        ImportChoice choice = ImportChoice.DETECT;
        String[] lines = text.split("\\R");
        for (int i = 0; i < lines.length; i++) {
            String line = lines[i].strip();
            if (!line.isEmpty() && !line.startsWith("#")) {
                try {
                    choice = with(choice, line);
                } catch (IllegalArgumentException unknown) {
                    throw new UnusableFileException(file, "line " + (i + 1) + " '" + line + "' is no line of a template ("
                            + unknown.getMessage() + "); correct it or save the template anew", unknown);
                }
            }
        }
        return choice;
    }

    private static ImportChoice with(ImportChoice choice, String line) {
        String[] sides = line.split("\\s*=\\s*", 2);
        String value = sides.length > 1 ? sides[1] : "";
        String[] parts = value.split("\\|", -1);
        return switch (sides[0]) {
            case "encoding" -> choice.withEncoding(Optional.of(value));
            case "separator" -> choice.withSeparator(Optional.of(constant(CurveSeparator.values(), value)));
            case "decimal-sign" -> choice.withDecimalSign(Optional.of(constant(DecimalSign.values(), value)));
            case "sheet" -> choice.withSheets(plus(choice, value));
            case "column" -> choice.with(new ColumnChoice(value.split("\\|", 4).length > 3 ? value.split("\\|", 4)[3] : "",
                    number(parts[0]), optional(part(parts, 1), NOT_READ, v -> constant(CurveQuantity.values(), v)),
                    part(parts, 2)));
            case "block" -> choice.with(new BlockChoice(number(parts[0]),
                    optional(part(parts, 1), AS_FOUND, v -> constant(BlockUse.values(), v)),
                    optional(part(parts, 2), AS_FOUND, TemplateText::taken)));
            default -> throw new IllegalArgumentException("the key '" + sides[0] + "' is not known");
        };
    }

    private static List<String> plus(ImportChoice choice, String sheet) {
        return Stream.concat(choice.sheets().stream(), Stream.of(sheet)).toList();
    }

    private static String part(String[] parts, int at) {
        if (at >= parts.length) {
            throw new IllegalArgumentException("a part behind a | is missing");
        }
        return parts[at];
    }

    private static boolean taken(String word) {
        return switch (word) {
            case "taken" -> true;
            case "left" -> false;
            default -> throw new IllegalArgumentException("'" + word + "' is neither taken nor left");
        };
    }

    private static int number(String text) {
        if (!text.matches("[1-9][0-9]{0,8}")) {
            throw new IllegalArgumentException("'" + text + "' is no number from 1");
        }
        return Integer.parseInt(text);
    }

    private static <T> Optional<T> optional(String text, String none, Function<String, T> otherwise) {
        return text.equals(none) ? Optional.empty() : Optional.of(otherwise.apply(text));
    }

    private static <E extends Enum<E>> E constant(E[] all, String word) {
        return Arrays.stream(all).filter(e -> word(e).equals(word)).findFirst()
                .orElseThrow(() -> new IllegalArgumentException("'" + word + "' is not known"));
    }
}
