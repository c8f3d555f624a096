package spanwright.circuits;

import spanwright.plant.FiberRange;

/**
 * Fronts of ports of one panel, in order.
 *
 * @param panel identity of the panel
 * @param ports the ports
 */
public record PortRange(int panel, FiberRange ports) {}
