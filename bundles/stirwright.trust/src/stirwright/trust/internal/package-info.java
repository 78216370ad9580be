/** The watcher of the folder and the user's lists; nobody outside this bundle needs it. */
package stirwright.trust.internal;
