/**
 * Hydrofoils. {@link stirwright.family.hydrofoil.Hydrofoil} is the service that the workbench finds; the
 * other classes hold its correlations, one method each.
 */
package stirwright.family.hydrofoil;
