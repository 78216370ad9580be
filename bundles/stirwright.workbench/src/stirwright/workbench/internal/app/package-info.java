/** The window as a whole: start, files, questions about dropped bundles. */
package stirwright.workbench.internal.app;
