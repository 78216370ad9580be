/** Tests of the window: the whole application in a running framework, driven as a user would. */
package stirwright.workbench.tests;
