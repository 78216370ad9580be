/** The flow-curve page without its widgets: the fluid's measured curves, the models fitted to them, and the edits of both. */
package stirwright.workbench.internal.flow;
