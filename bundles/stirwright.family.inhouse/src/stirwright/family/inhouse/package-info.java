package stirwright.family.inhouse;
