/** What the menus and keys do. */
package stirwright.workbench.internal.handlers;
