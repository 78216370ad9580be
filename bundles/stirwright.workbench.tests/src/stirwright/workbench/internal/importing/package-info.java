/** Tests of the import that need no window. */
package stirwright.workbench.internal.importing;
