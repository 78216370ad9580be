/** The widgets of the flow-curve page. None of them is made before the page is shown. */
package stirwright.workbench.internal.flowpage;
