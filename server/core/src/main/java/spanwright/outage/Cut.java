package spanwright.outage;

import spanwright.quantity.Length;

/** A thing that is cut, by the identity of its record. Several are one cut. */
public sealed interface Cut permits Cut.OfSpan, Cut.OfStructure, Cut.OfCable, Cut.OfTube, Cut.OfEnclosure, Cut.AtPlace {

    /**
     * Every cable section that lies on a span.
     *
     * @param span identity of the span
     */
    record OfSpan(int span) implements Cut {}

    /**
     * Every cable section that passes, begins or ends at a structure, and every enclosure there.
     *
     * @param structure identity of the structure
     */
    record OfStructure(int structure) implements Cut {}

    /**
     * All sections of a cable.
     *
     * @param cable identity of the cable
     */
    record OfCable(int cable) implements Cut {}

    /**
     * One tube in all sections of a cable.
     *
     * @param cable identity of the cable
     * @param tube from 1
     */
    record OfTube(int cable, int tube) implements Cut {}

    /**
     * What lies in an enclosure: joints, splitters, ports, and all glass that enters it; no cable is cut.
     *
     * @param enclosure identity of the enclosure
     */
    record OfEnclosure(int enclosure) implements Cut {}

    /**
     * The section of a cable at a place along its sheath; right at an enclosure both sections that meet there.
     *
     * @param cable identity of the cable
     * @param position the sheath position
     */
    record AtPlace(int cable, Length position) implements Cut {}
}
