package stirwright.family.propeller;
