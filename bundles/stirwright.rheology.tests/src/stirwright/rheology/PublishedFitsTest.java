package stirwright.rheology;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.io.IOException;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvFileSource;

/** Fits of measured curves against values that others found. */
class PublishedFitsTest {

	@ParameterizedTest(name = "{0} {1} {2}")
	@CsvFileSource(resources = "open-rheogram-fits.csv", useHeadersInDisplayName = true)
	void openRheograms(String rheogram, String model, String method, double yieldStress, double consistency,
			double flowIndex, double residual) throws IOException {
		Fit fit = fit(OpenRheograms.curve(rheogram), model, method);
		// the reference has nine digits; both searches stop where rounding hides any gain, about 1e-8 from the minimum
		double tolerance = 1e-6;
		switch (fit.model()) {
			case PowerLaw(double k, double n) -> {
				assertEquals(consistency, k, tolerance * consistency);
				assertEquals(flowIndex, n, tolerance * flowIndex);
			}
			case HerschelBulkley(double ty, double k, double n) -> {
				assertEquals(yieldStress, ty, tolerance * yieldStress);
				assertEquals(consistency, k, tolerance * consistency);
				assertEquals(flowIndex, n, tolerance * flowIndex);
			}
			default -> throw new AssertionError(fit.model());
		}
		assertEquals(model, fit.model().id());
		assertEquals(residual, fit.residualSumOfSquares(), tolerance * residual);
		assertEquals(21, fit.points());
	}

	@Test
	void rheogram73ToTheSixDigitsOfAnEarlierFit() throws IOException {
		// SciPy, absolute least squares and a straight line through the logarithms, six digits kept.
		FlowCurve curve = OpenRheograms.curve("73");
		double[] herschelBulkley = ModelKind.values(Fits.herschelBulkley(curve, Objective.ABSOLUTE).model());
		assertEquals(3.34539, herschelBulkley[0], 5e-6);
		assertEquals(1.23881, herschelBulkley[1], 5e-6);
		assertEquals(0.378847, herschelBulkley[2], 5e-7);
		double[] powerLaw = ModelKind.values(Fits.powerLawLogLog(curve).model());
		assertEquals(4.32468, powerLaw[0], 5e-6);
		assertEquals(0.178796, powerLaw[1], 5e-7);
	}

	@Test
	void brodkeyAndHersheyExample15Point1() {
		// Brodkey and Hershey, Transport Phenomena, Ex 15.1: printed n = 0.3841 and ln K = 9.17046, with the stress in
		// 1e-4 N/m2. The values with more digits were computed from the listed points, independently of this code.
		double[] rates = { 10, 20, 50, 100, 200, 400, 600, 1000, 2000 };
		double[] stresses = { 2.2, 3.1, 4.4, 5.8, 7.4, 9.8, 11.1, 13.9, 17.0 };
		double[] fitted = ModelKind.values(Fits.powerLawLogLog(FlowCurve.of(rates, stresses)).model());
		assertEquals(0.3841, fitted[1], 5e-5);
		assertEquals(9.17046, Math.log(1e4 * fitted[0]), 5e-6);
		assertEquals(0.38413, fitted[1], 5e-6);
		assertEquals(0.960906, fitted[0], 5e-7);
	}

	private static Fit fit(FlowCurve curve, String model, String method) {
		if (method.equals("LOG_LOG")) {
			return Fits.powerLawLogLog(curve);
		}
		Objective objective = Objective.valueOf(method);
		return model.equals("power-law") ? Fits.powerLaw(curve, objective) : Fits.herschelBulkley(curve, objective);
	}
}
