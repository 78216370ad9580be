/** How a case is solved; nobody outside this bundle needs it. */
package stirwright.core.internal;
