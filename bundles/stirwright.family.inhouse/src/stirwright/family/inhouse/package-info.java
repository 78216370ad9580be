/**
 * The template that a company copies for correlations of its own: {@link
 * stirwright.family.inhouse.InHouse} is all of it.
 */
package stirwright.family.inhouse;
