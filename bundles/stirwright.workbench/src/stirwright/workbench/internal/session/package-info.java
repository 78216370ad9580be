/** What the window has open, and what is computed from it, without widgets. */
package stirwright.workbench.internal.session;
