package stirwright.rheology;

import stirwright.rheology.internal.CarreauShape;
import stirwright.rheology.internal.CrossShape;
import stirwright.rheology.internal.LineShape;
import stirwright.rheology.internal.Measure;
import stirwright.rheology.internal.PlateauPowerShape;
import stirwright.rheology.internal.PowerShape;
import stirwright.rheology.internal.RootsShape;
import stirwright.rheology.internal.Shape;
import stirwright.rheology.internal.YieldLineShape;
import stirwright.rheology.internal.YieldPowerShape;

/** What a search is told of models and objectives. */
final class Shapes {

	private Shapes() {
	}

	static Shape of(ModelKind kind) {
		return switch (kind) {
			case NEWTONIAN -> new LineShape();
			case POWER_LAW -> new PowerShape();
			case BINGHAM -> new YieldLineShape();
			case HERSCHEL_BULKLEY -> new YieldPowerShape();
			case CASSON -> new RootsShape();
			case SISKO -> new PlateauPowerShape();
			case CROSS -> new CrossShape();
			case CARREAU -> new CarreauShape();
		};
	}

	static Measure measure(Objective objective) {
		return new Measure() {
			@Override
			public double deviation(double fitted, double measured) {
				return objective.deviation(fitted, measured);
			}

			@Override
			public double slope(double fitted, double measured) {
				return objective.slope(fitted, measured);
			}
		};
	}
}
