/** The command line: commands, and how results are laid out for reading. No window, no SWT. */
package stirwright.console.internal;
