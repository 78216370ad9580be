/** The zones of the window. */
package stirwright.workbench.internal.parts;
