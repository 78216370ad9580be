package stirwright.family.helicalscrew;
