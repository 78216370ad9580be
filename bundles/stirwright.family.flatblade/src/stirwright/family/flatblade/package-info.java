package stirwright.family.flatblade;
