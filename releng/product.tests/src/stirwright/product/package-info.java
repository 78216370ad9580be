/** Tests of the archives: what is in them, that it resolves on its platform, and that this platform's really runs. */
package stirwright.product;
