package stirwright.conformance;

/**
 * Published numbers that came with a bundle, as text: provenance in lines that start with {@code #},
 * a header, then one row for each number that a correlation must meet.
 *
 * @param name as messages name it
 */
public record ReferenceFile(String name, String text) {}
