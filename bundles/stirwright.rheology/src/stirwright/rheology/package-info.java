/**
 * Fluids whose shear stress depends on the shear rate alone: models, measured flow curves, and least-squares fits of
 * the first to the second.
 *
 * <p>SI throughout: shear rate in 1/s, stress in Pa, viscosity in Pa s, density in kg/m3. Everything here is immutable
 * and free of shared state. Not for fluids that remember (thixotropic, viscoelastic): a steady flow curve does not
 * describe them.
 *
 * <p>Not for code from outside, which relies on {@code stirwright.correlation} alone.
 */
@Version("1.0.0")
package stirwright.rheology;

import org.osgi.annotation.versioning.Version;
