/** Tables and JSON from one list of columns, and files that appear complete or not at all. */
package stirwright.exchange.internal.write;
