/** What the files promise, checked from outside: the expectations are the contract's, not the code's. */
package stirwright.exchange;
