package stirwright.family.tootheddisc;
