package stirwright.rheology;

/** Every parameter of every model, once. */
final class ModelParameters {

	static final Parameter VISCOSITY = with("viscosity", "Pa_s", "viscosity", "mu", "Pa s");
	static final Parameter CONSISTENCY = with("consistency", "Pa_sn", "consistency", "K", "Pa s^n");
	static final Parameter FLOW_INDEX = new Parameter("flow_index", "flow_index", "flow index", "n", "-");
	static final Parameter YIELD_STRESS = with("yield_stress", "Pa", "yield stress", "ty", "Pa");
	static final Parameter PLASTIC_VISCOSITY = with("plastic_viscosity", "Pa_s", "plastic viscosity", "mup", "Pa s");
	static final Parameter ZERO_SHEAR_VISCOSITY =
			with("zero_shear_viscosity", "Pa_s", "zero-shear viscosity", "m0", "Pa s");
	static final Parameter INFINITE_SHEAR_VISCOSITY =
			with("infinite_shear_viscosity", "Pa_s", "infinite-shear viscosity", "mi", "Pa s");
	static final Parameter TIME_CONSTANT = with("time_constant", "s", "time constant", "t", "s");

	private ModelParameters() {
	}

	private static Parameter with(String name, String suffix, String title, String symbol, String unit) {
		return new Parameter(name, name + "_" + suffix, title, symbol, unit);
	}
}
