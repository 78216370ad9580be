package stirwright.rheology.internal;

/** Where a flow index that must stay above 0 is held when the points ask for less. */
public final class LeastIndex {

	/** Small enough that no measurement tells it from 0. */
	public static final double VALUE = 1e-6;

	private LeastIndex() {
	}
}
