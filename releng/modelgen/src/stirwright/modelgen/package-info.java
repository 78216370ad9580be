/** Runs in the build, before the bundle that it writes for; no part of the product. */
package stirwright.modelgen;
