/**
 * Typed numbers with units. {@link stirwright.exchange.internal.units.UnitConversion} and what it calls are the only
 * classes that touch the units library, and are loaded when the first unit other than a field's own is typed.
 */
package stirwright.exchange.internal.units;
