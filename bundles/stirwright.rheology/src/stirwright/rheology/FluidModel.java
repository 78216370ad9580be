package stirwright.rheology;

/**
 * A fluid whose steady shear stress is a function of the shear rate, rising with it.
 *
 * <p>All methods take a shear rate in 1/s and throw {@link IllegalArgumentException}, naming the value, when it is not
 * a finite number greater than 0. None of them allocates.
 */
public sealed interface FluidModel permits Newtonian, PowerLaw, Bingham, HerschelBulkley, Casson, Sisko, Cross,
		Carreau {

	/** The model's name in files, for example {@code power-law}; see {@link ModelKind}. */
	default String id() {
		return ModelKind.of(this).id();
	}

	/** Shear stress in Pa. */
	double stress(double shearRate);

	/** Shear stress over shear rate, in Pa s. */
	double apparentViscosity(double shearRate);

	/**
	 * The local flow index, d ln(stress) / d ln(shear rate), dimensionless: the exponent of the power law that is
	 * tangent to this model at the given rate.
	 */
	double flowIndex(double shearRate);

	/** Yield stress in Pa; 0 for a model that has none. */
	default double yieldStress() {
		return 0;
	}
}
