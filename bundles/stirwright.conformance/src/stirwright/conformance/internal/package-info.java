/** How the checks are made; nobody outside this bundle needs it. */
package stirwright.conformance.internal;
