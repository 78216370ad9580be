/** Sheets of a workbook (Office Open XML, ECMA-376 part 1) as rows of cells; only what a flow curve needs of it. */
package stirwright.exchange.internal.workbook;
