package stirwright.family.anchor;
