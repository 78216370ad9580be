/** Tests of studies: their files, and the steps of their editing. */
package stirwright.study;
