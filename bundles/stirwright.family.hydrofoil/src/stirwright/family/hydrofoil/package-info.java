package stirwright.family.hydrofoil;
