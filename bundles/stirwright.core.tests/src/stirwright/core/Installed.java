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
                new Arrival(new DiscTurbine(), "stirwright.family.discturbine"),
                new Arrival(new PitchedBlade(), "stirwright.family.pitchedblade"),
                new Arrival(new GeneralRelations(), "stirwright.general")));
    }
}
