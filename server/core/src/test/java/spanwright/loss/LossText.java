package spanwright.loss;

import java.math.BigDecimal;
import java.util.stream.Collectors;
import spanwright.circuits.PortRange;
import spanwright.network.Snapshot;
import spanwright.plants.Drawing;
import spanwright.quantity.Wavelength;
import spanwright.trace.Path;
import spanwright.trace.Tracer;

/** Losses as text: {@code connector 0.5/0.75 planning | fiber 0.22/0.3 type = 0.72/1.05 (0.95)}. */
final class LossText {

    private LossText() {}

    static Path path(Snapshot plant, String port) {
        PortRange ports = Drawing.ports(plant.records(), port);
        return new Tracer(plant).fromPort(ports.panel(), ports.ports().first()).get(0);
    }

    static PathLoss loss(Snapshot plant, String port, int nanometres) {
        return (PathLoss) reckon(plant, port, nanometres);
    }

    static Reckoning reckon(Snapshot plant, String port, int nanometres) {
        return new LossReckoner(plant.records(), Wavelength.ofNanometres(nanometres)).reckon(path(plant, port));
    }

    /** Elements and sums, the statistical one in parentheses. */
    static String of(PathLoss loss) {
        return loss.elements().stream().map(LossText::of).collect(Collectors.joining(" | ")) + " = "
                + plain(loss.expected().decibels()) + "/" + plain(loss.limit().decibels()) + " ("
                + plain(loss.statistical().decibels()) + ")";
    }

    static String of(ElementLoss loss) {
        return loss.element().kind().word() + " " + plain(loss.expected().decibels()) + "/"
                + plain(loss.limit().decibels()) + " " + loss.basis().word();
    }

    private static String plain(double decibels) {
        return BigDecimal.valueOf(Math.round(decibels * 1e6), 6)
                .stripTrailingZeros()
                .toPlainString();
    }
}
