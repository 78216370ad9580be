package stirwright.exchange.internal.curves;

import java.util.List;

/**
 * What stands where under a row of names.
 *
 * @param line of the names; 0 without any
 * @param groups one for each sample, all complete
 * @param width how many columns the row of names fills; 0 when any row may be wider
 * @param problems what cannot be read, a sentence each
 * @param notes what is not read and may be missed, a sentence each
 * @param doubts what makes the curves themselves doubtful, a sentence each
 */
record Layout(int line, List<Group> groups, int width, List<String> problems, List<String> notes, List<String> doubts) {}
