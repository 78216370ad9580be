/** Numerical work behind the fits. Not exported; it may change at any time. */
package stirwright.rheology.internal;
