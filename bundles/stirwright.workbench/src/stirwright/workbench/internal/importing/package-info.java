/** How measured flow curves come in: the preview of a source, and what can be overruled in it. */
package stirwright.workbench.internal.importing;
