package stirwright.family.retreatcurve;
