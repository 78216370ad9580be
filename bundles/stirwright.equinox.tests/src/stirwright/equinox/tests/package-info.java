/** Tests that need a running framework: bundles resolved, Declarative Services live. */
package stirwright.equinox.tests;
