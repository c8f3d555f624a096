package spanwright.fault;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Objects;
import java.util.stream.Collectors;
import org.jspecify.annotations.Nullable;
import spanwright.circuits.PortRange;
import spanwright.network.Snapshot;
import spanwright.plant.Pass;
import spanwright.plant.RunRow;
import spanwright.plants.Drawing;
import spanwright.quantity.Length;
import spanwright.quantity.Wavelength;
import spanwright.records.RecordsView;
import spanwright.splicing.EndKey;
import spanwright.splicing.LegKind;
import spanwright.trace.Fiber;

/** Shots at drawn plants, and their places as one line each, lengths to the millimeter. */
final class FaultText {

    private final Snapshot plant;
    private final List<KnownEvent> events = new ArrayList<>();
    private Length launch = Length.ZERO;
    private @Nullable Double index;
    private int nanometres = 1550;
    private @Nullable Long to;

    private FaultText(Snapshot plant) {
        this.plant = plant;
    }

    static FaultText in(String drawing) {
        return new FaultText(Drawing.of(drawing));
    }

    static FaultText in(Snapshot plant) {
        return new FaultText(plant);
    }

    FaultText index(double set) {
        index = set;
        return this;
    }

    FaultText wavelength(int nm) {
        nanometres = nm;
        return this;
    }

    FaultText launch(double metres) {
        launch = Length.ofMetres(metres);
        return this;
    }

    FaultText event(String enclosure, double metres) {
        events.add(new KnownEvent(plant.records().enclosures().find(enclosure).orElseThrow(), Length.ofMetres(metres)));
        return this;
    }

    FaultText to(String port) {
        to = front(port);
        return this;
    }

    FaultText toEnd(long key) {
        to = key;
        return this;
    }

    long front(String port) {
        PortRange ports = Drawing.ports(plant.records(), port);
        return EndKey.of(LegKind.FRONT, ports.panel(), ports.ports().first());
    }

    /** The end of a cable's fiber in an enclosure. */
    long end(String cable, LegKind kind, int fiber, String enclosure) {
        RecordsView records = plant.records();
        RunRow row = records.passesOf(records.cables().find(cable).orElseThrow().id()).stream()
                .filter(pass ->
                        records.enclosures().get(pass.enclosure()).code().equals(enclosure))
                .map(Pass::runRow)
                .map(records.runRows()::get)
                .findFirst()
                .orElseThrow();
        return EndKey.of(kind, row.id(), fiber);
    }

    long terminal(String splitter, LegKind kind, int number) {
        int id = plant.records()
                .splitters()
                .list()
                .filter(each -> each.code().equals(splitter))
                .findFirst()
                .orElseThrow()
                .id();
        return EndKey.of(kind, id, number);
    }

    Reading reading(double metres) {
        return new Reading(Length.ofMetres(metres), launch, index, Wavelength.ofNanometres(nanometres), events);
    }

    FaultAnswer answer(String port, double metres) {
        return answer(front(port), metres);
    }

    FaultAnswer answer(long start, double metres) {
        return new FaultFinder(plant).find(start, to, reading(metres));
    }

    FaultPlace place(String port, double metres) {
        List<FaultPlace> places = ((FaultPlaces) answer(port, metres)).places();
        if (places.size() != 1) {
            throw new AssertionError(places.size() + " places");
        }
        return places.get(0);
    }

    String at(String port, double metres) {
        return at(front(port), metres);
    }

    String at(long start, double metres) {
        FaultAnswer answer = answer(start, metres);
        return answer instanceof NotPlaced none ? "no: " + none.sentence() : lines(((FaultPlaces) answer).places());
    }

    private static String lines(List<FaultPlace> places) {
        return places.stream().map(FaultText::line).collect(Collectors.joining("\n"));
    }

    /** {@code H1>H2 +500 -529.126 H1-H2 F-1:1@520 mark 5500 m white glass 525.2}. */
    static String line(FaultPlace place) {
        Where where = place.where();
        Fiber fiber = where.fiber();
        List<String> words = new ArrayList<>(Arrays.asList(
                where.before().code() + ">" + where.after().code(),
                "+" + metres(where.beyondBefore()),
                "-" + metres(where.shortOfAfter()),
                where.span() == null ? where.lies().word() : where.span().code()));
        if (fiber != null) {
            words.add(fiber.cable().code() + ":" + fiber.fiber() + "@"
                    + metres(Objects.requireNonNull(where.sheathPosition())));
            where.findMark()
                    .ifPresent(mark -> words.add("mark "
                            + mark.number().stripTrailingZeros().toPlainString() + " "
                            + mark.unit().symbol() + " " + fiber.cable().marksInk()));
        }
        place.findCoil().ifPresent(coil -> words.add("coil " + coil.code()));
        words.add("glass " + metres(place.glass()));
        if (place.pastEnd()) {
            words.add("over " + metres(place.over()));
        }
        return String.join(" ", words);
    }

    private static String metres(Length length) {
        return new BigDecimal(length.exactMetres().toPlainString())
                .setScale(3, RoundingMode.HALF_EVEN)
                .stripTrailingZeros()
                .toPlainString();
    }
}
