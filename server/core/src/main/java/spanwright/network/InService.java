package spanwright.network;

import spanwright.plant.Cable;
import spanwright.plant.Enclosure;
import spanwright.plant.PlantState;

/** Whether plant is in service: only such plant is in the network. */
final class InService {

    private InService() {}

    static boolean is(Enclosure enclosure) {
        return enclosure.state() == PlantState.IN_SERVICE;
    }

    static boolean is(Cable cable) {
        return cable.state() == PlantState.IN_SERVICE;
    }
}
