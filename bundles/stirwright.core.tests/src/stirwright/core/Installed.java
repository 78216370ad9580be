package stirwright.core;

import java.util.List;
import stirwright.family.discturbine.DiscTurbine;
import stirwright.family.pitchedblade.PitchedBlade;
import stirwright.general.GeneralRelations;

/** The families of the product without OSGi: their services are plain classes. */
final class Installed {
    private Installed() {}

    static Catalogue catalogue() {
        return Catalogue.of(List.of(
                Arrival.of(new DiscTurbine(), "stirwright.family.discturbine"),
                Arrival.of(new PitchedBlade(), "stirwright.family.pitchedblade"),
                Arrival.of(new GeneralRelations(), "stirwright.general")));
    }
}
