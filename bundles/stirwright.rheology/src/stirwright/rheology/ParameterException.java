package stirwright.rheology;

/**
 * A parameter lies outside its hard limits. The message names parameter, value and allowed range, for example
 * {@code flow_index = 2.5: must be greater than 0 and at most 2}; the parts are there for callers that know the
 * parameter by another name, such as a column.
 */
public final class ParameterException extends RuntimeException {

	private static final long serialVersionUID = 1L;

	private final String parameter;
	private final double value;
	private final String allowed;

	/**
	 * @param parameter name as in the case table, without its unit
	 * @param value     the value that was given
	 * @param allowed   the allowed range in words, starting with "must"
	 */
	public ParameterException(String parameter, double value, String allowed) {
		super(parameter + " = " + value + ": " + allowed);
		this.parameter = parameter;
		this.value = value;
		this.allowed = allowed;
	}

	/** The parameter's name as in the case table, without its unit: {@code flow_index}. */
	public String parameter() {
		return parameter;
	}

	/** The value that was given; may be NaN or infinite. */
	public double value() {
		return value;
	}

	/** The allowed range in words, starting with "must". */
	public String allowed() {
		return allowed;
	}
}
