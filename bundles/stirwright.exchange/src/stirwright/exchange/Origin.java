package stirwright.exchange;

/**
 * Where results come from.
 *
 * @param version of the product
 * @param file name of the file that was read; empty when there is none
 */
public record Origin(String version, String file) {}
