/** The columns of a case table and how a row becomes a case. */
package stirwright.exchange.internal.cases;
