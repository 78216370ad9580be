/** How a study is written down and read again, and the steps of its editing. */
package stirwright.study.internal;
