package stirwright.trust;

import java.time.LocalDate;

/**
 * A line of the user's list of approved bundles. The hash alone counts; the rest is for people.
 *
 * @param sha256 64 hexadecimal digits in lower case
 * @param bundle name and version that the bundle had when it was approved
 * @param date of the approval
 */
public record Approval(String sha256, String bundle, LocalDate date) {}
