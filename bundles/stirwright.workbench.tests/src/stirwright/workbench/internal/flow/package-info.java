/** Tests of the flow-curve page that need no window. */
package stirwright.workbench.internal.flow;
