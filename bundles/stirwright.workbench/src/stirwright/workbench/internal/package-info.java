/** The window. */
package stirwright.workbench.internal;
