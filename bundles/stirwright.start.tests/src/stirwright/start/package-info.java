/** Tests of the choice between the window and the command line. */
package stirwright.start;
