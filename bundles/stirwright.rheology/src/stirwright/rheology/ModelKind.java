package stirwright.rheology;

import static stirwright.rheology.ModelParameters.CONSISTENCY;
import static stirwright.rheology.ModelParameters.FLOW_INDEX;
import static stirwright.rheology.ModelParameters.INFINITE_SHEAR_VISCOSITY;
import static stirwright.rheology.ModelParameters.PLASTIC_VISCOSITY;
import static stirwright.rheology.ModelParameters.TIME_CONSTANT;
import static stirwright.rheology.ModelParameters.VISCOSITY;
import static stirwright.rheology.ModelParameters.YIELD_STRESS;
import static stirwright.rheology.ModelParameters.ZERO_SHEAR_VISCOSITY;

import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.function.Function;
import java.util.stream.Collectors;

/** How files name each fluid model and its parameters; builds a model from named values and takes it apart again. */
public enum ModelKind {

	NEWTONIAN("newtonian", v -> new Newtonian(v[0]), VISCOSITY),
	POWER_LAW("power-law", v -> new PowerLaw(v[0], v[1]), CONSISTENCY, FLOW_INDEX),
	BINGHAM("bingham", v -> new Bingham(v[0], v[1]), YIELD_STRESS, PLASTIC_VISCOSITY),
	HERSCHEL_BULKLEY("herschel-bulkley", v -> new HerschelBulkley(v[0], v[1], v[2]),
			YIELD_STRESS, CONSISTENCY, FLOW_INDEX),
	CASSON("casson", v -> new Casson(v[0], v[1]), YIELD_STRESS, PLASTIC_VISCOSITY),
	SISKO("sisko", v -> new Sisko(v[0], v[1], v[2]), INFINITE_SHEAR_VISCOSITY, CONSISTENCY, FLOW_INDEX),
	CROSS("cross", v -> new Cross(v[0], v[1], v[2], v[3]),
			ZERO_SHEAR_VISCOSITY, INFINITE_SHEAR_VISCOSITY, TIME_CONSTANT, FLOW_INDEX),
	CARREAU("carreau", v -> new Carreau(v[0], v[1], v[2], v[3]),
			ZERO_SHEAR_VISCOSITY, INFINITE_SHEAR_VISCOSITY, TIME_CONSTANT, FLOW_INDEX);

	private final String id;
	private final List<Parameter> parameters;
	private final Function<double[], FluidModel> factory;

	ModelKind(String id, Function<double[], FluidModel> factory, Parameter... parameters) {
		this.id = id;
		this.factory = factory;
		this.parameters = List.of(parameters);
	}

	/** The name in files, for example {@code herschel-bulkley}. */
	public String id() {
		return id;
	}

	/** The parameters in the order in which {@link #create} takes and {@link #values(FluidModel)} returns them. */
	public List<Parameter> parameters() {
		return parameters;
	}

	/** Whether it has a yield stress, which may be 0. */
	public boolean yields() {
		return parameters.contains(YIELD_STRESS);
	}

	/**
	 * Builds a model of this kind.
	 *
	 * @param values one for each of {@link #parameters()}, in their order and SI units
	 * @throws IllegalArgumentException if there are too few or too many
	 * @throws ParameterException       if a value is out of its limits
	 */
	public FluidModel create(double... values) {
		if (values.length != parameters.size()) {
			String names = parameters.stream().map(Parameter::name).collect(Collectors.joining(", "));
			throw new IllegalArgumentException(
					id + " takes " + parameters.size() + " values (" + names + "), not " + values.length);
		}
		return factory.apply(values);
	}

	/** The kind with the given id; case matters. */
	public static Optional<ModelKind> byId(String id) {
		return Arrays.stream(values()).filter(kind -> kind.id.equals(id)).findFirst();
	}

	/** The kind that a model is of. */
	public static ModelKind of(FluidModel model) {
		return switch (model) {
			case Newtonian m -> NEWTONIAN;
			case PowerLaw m -> POWER_LAW;
			case Bingham m -> BINGHAM;
			case HerschelBulkley m -> HERSCHEL_BULKLEY;
			case Casson m -> CASSON;
			case Sisko m -> SISKO;
			case Cross m -> CROSS;
			case Carreau m -> CARREAU;
		};
	}

	/** The values of a model's parameters, in the order of its kind's {@link #parameters()}. */
	public static double[] values(FluidModel model) {
		return switch (model) {
			case Newtonian(double mu) -> new double[] { mu };
			case PowerLaw(double k, double n) -> new double[] { k, n };
			case Bingham(double ty, double mup) -> new double[] { ty, mup };
			case HerschelBulkley(double ty, double k, double n) -> new double[] { ty, k, n };
			case Casson(double ty, double mup) -> new double[] { ty, mup };
			case Sisko(double mi, double k, double n) -> new double[] { mi, k, n };
			case Cross(double m0, double mi, double t, double n) -> new double[] { m0, mi, t, n };
			case Carreau(double m0, double mi, double t, double n) -> new double[] { m0, mi, t, n };
		};
	}
}
