/** How a text table becomes a flow curve. */
package stirwright.exchange.internal.curves;
