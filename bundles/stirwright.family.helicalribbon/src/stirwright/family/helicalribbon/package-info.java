package stirwright.family.helicalribbon;
