package spanwright.fault;

import static org.assertj.core.api.Assertions.assertThat;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
import java.util.Objects;
import java.util.Random;
import java.util.stream.IntStream;
import org.jspecify.annotations.Nullable;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import spanwright.journal.Change;
import spanwright.network.Snapshot;
import spanwright.plant.RunRow;
import spanwright.plants.RandomPlant;
import spanwright.quantity.Length;
import spanwright.quantity.Wavelength;
import spanwright.records.Records;
import spanwright.records.RecordsEditor;
import spanwright.splicing.EndKey;
import spanwright.splicing.Joint;
import spanwright.splicing.JointKind;
import spanwright.splicing.LegKind;
import spanwright.splicing.Panel;
import spanwright.trace.Path;
import spanwright.trace.SplitterCrossing;
import spanwright.trace.Tracer;

/** The finder against its slow twin, on random plants. */
class FaultTwinTest {

    private static final double LENGTH = 2e-5;
    /** A mark is told to a thousandth. */
    private static final double MARK = 6e-4;

    private static final double DEGREE = 1e-8;
    private static final int READINGS = 6;

    static IntStream seeds() {
        return IntStream.range(0, 220);
    }

    @ParameterizedTest(name = "seed {0}")
    @MethodSource("seeds")
    void places_as_the_twin_does(int seed) {
        Records records = RandomPlant.of(seed).entered();
        Snapshot snapshot = Snapshot.of(records);
        Tracer tracer = new Tracer(snapshot);
        FaultFinder finder = new FaultFinder(snapshot);
        Random chance = new Random(seed);
        for (long start : starts(records)) {
            List<Path> paths = tracer.fromEnd(start);
            if (!paths.isEmpty() && paths.stream().noneMatch(Path::loop)) {
                for (int reading = 0; reading < READINGS; reading++) {
                    compare(records, paths, finder, start, reading(paths, chance), BigDecimal.ZERO, null);
                }
            }
        }
    }

    /** Reels with an index of their own beside types of two indexes, behind a launch fiber. */
    @ParameterizedTest(name = "seed {0}")
    @MethodSource("seeds")
    void places_by_the_index_of_each_glass_as_the_twin_does(int seed) {
        Records records = RandomPlant.of(seed).entered();
        Snapshot snapshot = Snapshot.of(records);
        Tracer tracer = new Tracer(snapshot);
        FaultFinder finder = new FaultFinder(snapshot);
        Random chance = new Random(1000 + seed);
        for (long start : starts(records)) {
            List<Path> paths = tracer.fromEnd(start);
            if (!paths.isEmpty() && paths.stream().noneMatch(Path::loop)) {
                BigDecimal launch = BigDecimal.valueOf(chance.nextInt(0, 600));
                BigDecimal set = BigDecimal.valueOf(1.4640 + chance.nextInt(8) * 0.001);
                // By half a per cent more than the launch fiber reads at most, so that no reading lies within it.
                BigDecimal reading = reading(paths, chance).add(launch.multiply(new BigDecimal("1.006")));
                compare(records, paths, finder, start, reading, launch, set);
            }
        }
    }

    /** A coil that is drawn on or added to moves each place behind it by as much sheath. */
    @Test
    void a_coil_that_changes_moves_the_place_as_the_twin_says() {
        int moved = 0;
        for (int seed = 0; seed < 220; seed++) {
            Records records = RandomPlant.of(seed).entered();
            RunRow coil = records.runRows()
                    .list()
                    .filter(row -> row.slack().micrometres() > 0)
                    .findFirst()
                    .orElse(null);
            if (coil != null) {
                RecordsEditor editor = records.edit();
                editor.apply(Change.replace(
                        coil,
                        new RunRow(
                                coil.id(),
                                coil.cable(),
                                coil.seq(),
                                coil.structure(),
                                coil.span(),
                                coil.slack().plus(Length.ofMetres(7.5)),
                                coil.slackTrust(),
                                coil.slackOn(),
                                coil.duct())));
                moved += moved(records, editor.build(records.posting() + 1), seed);
            }
        }
        assertThat(moved).as("places that moved").isGreaterThan(100);
    }

    private static int moved(Records before, Records after, int seed) {
        Snapshot was = Snapshot.of(before);
        Snapshot is = Snapshot.of(after);
        Random chance = new Random(seed);
        int moved = 0;
        for (long start : starts(before)) {
            List<Path> paths = new Tracer(is).fromEnd(start);
            if (!paths.isEmpty() && paths.stream().noneMatch(Path::loop)) {
                BigDecimal reading = reading(paths, chance);
                compare(after, paths, new FaultFinder(is), start, reading, BigDecimal.ZERO, null);
                moved += lines(was, start, reading).equals(lines(is, start, reading)) ? 0 : 1;
            }
        }
        return moved;
    }

    private static List<String> lines(Snapshot snapshot, long start, BigDecimal reading) {
        return places(new FaultFinder(snapshot), start, reading, BigDecimal.ZERO, null).stream()
                .map(FaultText::line)
                .toList();
    }

    private static List<FaultPlace> places(
            FaultFinder finder, long start, BigDecimal reading, BigDecimal launch, @Nullable BigDecimal set) {
        Reading read = new Reading(
                Length.ofMetres(reading),
                Length.ofMetres(launch),
                set == null ? null : set.doubleValue(),
                Wavelength.ofNanometres(1550),
                List.of());
        return ((FaultPlaces) finder.find(start, null, read)).places();
    }

    private static List<Long> starts(Records records) {
        List<Long> starts = new ArrayList<>();
        for (Panel panel : records.panels().list().toList()) {
            for (int port = 1; port <= panel.ports(); port += 3) {
                starts.add(EndKey.of(LegKind.FRONT, panel.id(), port));
            }
        }
        records.joints()
                .list()
                .filter(joint -> joint.type() == JointKind.SPLICE && !joint.planned())
                .map(Joint::a)
                .forEach(ends -> starts.add(ends.key(0)));
        return starts;
    }

    /** To a ten-thousandth that no boundary lies at, now and then beyond the end. */
    private static BigDecimal reading(List<Path> paths, Random chance) {
        double longest =
                paths.stream().mapToDouble(path -> path.glass().metres()).max().orElse(0);
        long millimetres = (long) (chance.nextDouble() * (longest * 1.1 + 1) * 1e3);
        return BigDecimal.valueOf(millimetres, 3).add(new BigDecimal("0.00037"));
    }

    private static void compare(
            Records records,
            List<Path> paths,
            FaultFinder finder,
            long start,
            BigDecimal reading,
            BigDecimal launch,
            @Nullable BigDecimal set) {
        List<Path> leading = paths.stream()
                .filter(path -> path.elements().isEmpty()
                        || !(path.elements().get(path.elements().size() - 1) instanceof SplitterCrossing))
                .toList();
        List<FaultTwin.Found> expected = (leading.isEmpty() ? paths.subList(0, 1) : leading)
                .stream()
                        .map(path -> new FaultTwin(records, path).find(reading, launch, set))
                        .toList();
        List<FaultPlace> places = places(finder, start, reading, launch, set);
        for (FaultPlace place : places) {
            assertThat(expected.stream().anyMatch(found -> same(place, found)))
                    .as("%s %s: %s for %s", start, reading, FaultText.line(place), expected)
                    .isTrue();
        }
        for (FaultTwin.Found found : expected) {
            assertThat(places.stream().anyMatch(place -> same(place, found)))
                    .as("%s %s: %s is not among %d places", start, reading, found, places.size())
                    .isTrue();
        }
        places.forEach(FaultTwinTest::assertWindow);
    }

    private static boolean same(FaultPlace place, FaultTwin.Found found) {
        Where where = place.where();
        return where.lies().word().equals(found.lies)
                && where.before().code().equals(found.before)
                && where.after().code().equals(found.after)
                && Objects.equals(where.span() == null ? null : where.span().code(), found.span)
                && Objects.equals(fiber(where), found.fiber)
                && near(where.beyondBefore().metres(), found.beyond, LENGTH)
                && near(where.shortOfAfter().metres(), found.shortOf, LENGTH)
                && near(place.glass().metres(), found.glass, LENGTH)
                && near(place.pastEnd() ? place.over().metres() : -1, found.over, LENGTH)
                && (where.sheathPosition() == null
                        || near(where.sheathPosition().metres(), found.sheath, LENGTH))
                && sameMark(where, found)
                && (found.span == null
                        || (near(where.position().lon(), found.lon, degrees(found))
                                && near(where.position().lat(), found.lat, degrees(found))));
    }

    /** On a span whose marks leave it little sheath a micrometre of sheath is more of the map. */
    private static double degrees(FaultTwin.Found found) {
        return DEGREE * (1 + 10 / (found.beyond + found.shortOf));
    }

    private static @Nullable String fiber(Where where) {
        return where.fiber() == null
                ? null
                : where.fiber().cable().code() + ":" + where.fiber().fiber();
    }

    private static boolean sameMark(Where where, FaultTwin.Found found) {
        return found.mark == null
                ? where.findMark().isEmpty()
                : where.findMark().isPresent()
                        && near(where.findMark().get().number().doubleValue(), found.mark, MARK);
    }

    private static boolean near(double actual, double expected, double tolerance) {
        return Math.abs(actual - expected) <= tolerance;
    }

    /** A place is within its own window, and the window names its causes. */
    private static void assertWindow(FaultPlace place) {
        assertThat(place.window().line()).isNotEmpty();
        assertThat(place.uncertainty().within()).isGreaterThan(Length.ZERO);
        if (place.findCoil().isPresent()) {
            assertThat(place.window().coils()).contains(place.findCoil().get());
        }
    }

    @Test
    void the_twin_notices_what_is_wrong() {
        FaultTwin.Found found = new FaultTwin.Found();
        found.lies = "span";
        FaultPlace place = FaultText.in("""
                cable F-1 1 : H1 1000 H2
                enclosure E1 H1 : F-1
                panel E1 P 1
                term E1/P/1 = F-1 ahead 1
                """).place("E1/P/1", 10);

        assertThat(same(place, found)).isFalse();
    }
}
