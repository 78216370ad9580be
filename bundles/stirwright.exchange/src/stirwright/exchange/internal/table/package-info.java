/** Text tables as people and spreadsheets write them: encoding, separator, decimal sign, rows. */
package stirwright.exchange.internal.table;
