package stirwright.core;

/** What settles the impeller's speed: a speed, or a target that every candidate solves for. */
public sealed interface SpeedDemand {

    /** In m/s. Common practice, no source: toothed discs stay below half of it; above, a unit was mistaken. */
    double MOST_TIP_SPEED = 60;

    /** In rev/s: one turn in three hours. Common practice, no source: no agitator runs slower. */
    double LEAST_SPEED = 1e-4;

    /** The target or the speed, in the unit that its kind says. */
    double value();

    /** The name of the input, as a case table heads its column. */
    String field();

    /** A speed in rev/s. */
    record At(double value) implements SpeedDemand {
        @Override
        public String field() {
            return "speed_rev_s";
        }
    }

    /** The least speed, and so the least power, that gives this average shear rate in 1/s. */
    record ForShearRate(double value) implements SpeedDemand {
        @Override
        public String field() {
            return "target_shear_rate_1_s";
        }
    }

    /** The speed that gives this power per volume in W/m3. */
    record ForPowerPerVolume(double value) implements SpeedDemand {
        @Override
        public String field() {
            return "target_power_per_volume_W_m3";
        }
    }

    /** The speed of this tip speed in m/s. */
    record ForTipSpeed(double value) implements SpeedDemand {
        @Override
        public String field() {
            return "target_tip_speed_m_s";
        }
    }
}
