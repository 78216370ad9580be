/**
 * Toothed high-speed discs. {@link stirwright.family.tootheddisc.ToothedDisc} is the service that the
 * workbench finds, and holds all that is known here, which is little.
 */
package stirwright.family.tootheddisc;
