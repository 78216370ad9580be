/** Looks and controls that know nothing of a case. */
package stirwright.workbench.internal.widgets;
