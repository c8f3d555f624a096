package spanwright.sqlite.rows;

import java.math.BigDecimal;
import java.time.LocalDate;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Random;
import java.util.TreeMap;
import java.util.function.Supplier;
import org.jspecify.annotations.Nullable;
import org.locationtech.jts.geom.Coordinate;
import org.locationtech.jts.geom.GeometryFactory;
import spanwright.circuits.Circuit;
import spanwright.circuits.CircuitStatus;
import spanwright.circuits.PortRange;
import spanwright.journal.RecordKind;
import spanwright.journal.Recorded;
import spanwright.plant.BaseFeature;
import spanwright.plant.Cable;
import spanwright.plant.CableType;
import spanwright.plant.CableValue;
import spanwright.plant.ColorCode;
import spanwright.plant.Enclosure;
import spanwright.plant.EnclosureKind;
import spanwright.plant.FiberRange;
import spanwright.plant.FiberType;
import spanwright.plant.FiberValues;
import spanwright.plant.Line;
import spanwright.plant.Pass;
import spanwright.plant.Placement;
import spanwright.plant.PlantState;
import spanwright.plant.Position;
import spanwright.plant.RunRow;
import spanwright.plant.Setting;
import spanwright.plant.SheathMark;
import spanwright.plant.Span;
import spanwright.plant.Structure;
import spanwright.plant.StructureKind;
import spanwright.plant.Trust;
import spanwright.quantity.Length;
import spanwright.quantity.LengthUnit;
import spanwright.quantity.Loss;
import spanwright.quantity.Wavelength;
import spanwright.splicing.Direction;
import spanwright.splicing.EndCondition;
import spanwright.splicing.EndRange;
import spanwright.splicing.EndState;
import spanwright.splicing.FiberCount;
import spanwright.splicing.FiberFlag;
import spanwright.splicing.Flag;
import spanwright.splicing.Joint;
import spanwright.splicing.JointFacts;
import spanwright.splicing.JointKind;
import spanwright.splicing.Leg;
import spanwright.splicing.LegKind;
import spanwright.splicing.Measurement;
import spanwright.splicing.Panel;
import spanwright.splicing.PlanningValue;
import spanwright.splicing.SpliceMethod;
import spanwright.splicing.Splitter;

/** Records of every kind with whatever their columns may hold, drawn at random: of no plant, and of no sense. */
public final class SampleRecords {

    private static final String[] WORDS = {
        "", "a", "F-1", "blue with 2 black tracers", "a;b", "c\\e", "two\nlines", "1=2", "Zürich", "北", "\uD83D\uDE00"
    };

    private final Random random;

    /** Records that follow from a seed. */
    public SampleRecords(long seed) {
        this.random = new Random(seed);
    }

    private <T> @Nullable T maybe(Supplier<T> value) {
        return random.nextInt(3) == 0 ? null : value.get();
    }

    private <T> T any(T[] values) {
        return values[random.nextInt(values.length)];
    }

    private String word() {
        return any(WORDS) + (random.nextBoolean() ? "" : random.nextInt(100));
    }

    private List<String> words() {
        List<String> words = new ArrayList<>();
        for (int count = random.nextInt(4); count > 0; count--) {
            words.add(word());
        }
        return words;
    }

    private int number() {
        return 1 + random.nextInt(random.nextBoolean() ? 20 : Integer.MAX_VALUE - 1);
    }

    private Length length() {
        return new Length(random.nextInt(4) == 0 ? random.nextLong() : random.nextInt(1_000_000));
    }

    private Loss loss() {
        return new Loss(random.nextInt(4) == 0 ? random.nextLong() : random.nextInt(500_000) - 100_000);
    }

    private Wavelength wavelength() {
        return new Wavelength(1_260_000 + random.nextInt(400_000));
    }

    private LocalDate date() {
        return LocalDate.ofEpochDay(random.nextInt(40_000));
    }

    private double real() {
        return random.nextInt(5) == 0 ? Double.MIN_VALUE : random.nextGaussian() * 20;
    }

    private FiberRange range(int count) {
        int first = 1 + random.nextInt(800);
        return random.nextBoolean()
                ? new FiberRange(first, first + count - 1)
                : new FiberRange(first + count - 1, first);
    }

    private List<FiberRange> ranges() {
        List<FiberRange> ranges = new ArrayList<>();
        for (int count = random.nextInt(4); count > 0; count--) {
            ranges.add(range(1 + random.nextInt(12)));
        }
        return ranges;
    }

    private EndRange ends(int count) {
        return new EndRange(new Leg(any(LegKind.values()), number()), range(count));
    }

    private Position position() {
        return new Position(random.nextDouble() * 360 - 180, random.nextDouble() * 180 - 90);
    }

    private Line line() {
        List<Position> positions = new ArrayList<>(List.of(position(), new Position(-0.0, 1e-7)));
        for (int count = random.nextInt(4); count > 0; count--) {
            positions.add(position());
        }
        return new Line(positions);
    }

    /** A record of a kind with a given identity. */
    public Recorded draw(RecordKind kind, int id) {
        return switch (kind) {
            case SETTING -> new Setting(id, word(), word());
            case STRUCTURE -> structure(id);
            case SPAN -> span(id);
            case FIBER_TYPE -> fiberType(id);
            case COLOR_CODE -> new ColorCode(id, word(), words());
            case CABLE_TYPE -> cableType(id);
            case CABLE -> cable(id);
            case CABLE_VALUE ->
                new CableValue(id, number(), wavelength(), maybe(this::real), maybe(this::loss), maybe(this::word));
            case RUN_ROW -> runRow(id);
            case SHEATH_MARK -> sheathMark(id);
            case ENCLOSURE -> enclosure(id);
            case PASS -> new Pass(id, number(), number(), number(), ranges(), ranges());
            case SPLITTER -> splitter(id);
            case PANEL -> new Panel(id, number(), word(), number(), word());
            case JOINT -> joint(id);
            case END_STATE ->
                new EndState(id, number(), ends(1), any(EndCondition.values()), any(Trust.values()), maybe(this::date));
            case MEASUREMENT -> measurement(id);
            case FIBER_FLAG -> fiberFlag(id);
            case FIBER_COUNT -> new FiberCount(id, number(), range(3), word(), range(3));
            case CIRCUIT -> circuit(id);
            case PLANNING_VALUE ->
                new PlanningValue(id, word(), loss(), maybe(this::loss), maybe(this::loss), maybe(this::word));
            case BASE_FEATURE -> baseFeature(id);
        };
    }

    private Structure structure(int id) {
        return new Structure(
                id,
                word(),
                any(StructureKind.values()),
                position(),
                maybe(this::length),
                maybe(this::word),
                any(PlantState.values()),
                words(),
                maybe(this::word));
    }

    private Span span(int id) {
        return new Span(
                id,
                word(),
                number(),
                number(),
                any(Placement.values()),
                maybe(this::length),
                maybe(this::line),
                any(PlantState.values()),
                words(),
                maybe(this::word));
    }

    private FiberType fiberType(int id) {
        List<FiberValues> values = new ArrayList<>();
        for (int count = random.nextInt(4); count > 0; count--) {
            values.add(new FiberValues(wavelength(), loss(), loss(), maybe(this::real)));
        }
        return new FiberType(id, word(), values, maybe(this::real), maybe(this::real), maybe(this::real));
    }

    private CableType cableType(int id) {
        return new CableType(
                id, word(), number(), number(), word(), real(), random.nextBoolean(), maybe(this::number), word());
    }

    private Cable cable(int id) {
        return new Cable(
                id,
                word(),
                number(),
                maybe(this::word),
                word(),
                maybe(this::real),
                maybe(this::word),
                maybe(this::date),
                any(PlantState.values()),
                maybe(this::word));
    }

    private RunRow runRow(int id) {
        return new RunRow(
                id,
                number(),
                random.nextInt(100),
                number(),
                maybe(this::number),
                length(),
                any(Trust.values()),
                maybe(this::date),
                maybe(this::word));
    }

    private SheathMark sheathMark(int id) {
        return new SheathMark(
                id,
                number(),
                word(),
                any(LengthUnit.values()),
                maybe(() -> new BigDecimal("1049.50")),
                maybe(() -> BigDecimal.valueOf(random.nextLong(), random.nextInt(20) - 10)),
                maybe(this::date),
                any(Trust.values()));
    }

    private Enclosure enclosure(int id) {
        return new Enclosure(
                id,
                word(),
                number(),
                any(EnclosureKind.values()),
                length(),
                any(PlantState.values()),
                maybe(this::word));
    }

    private Splitter splitter(int id) {
        Map<Integer, Loss> losses = new TreeMap<>();
        for (int count = random.nextInt(4); count > 0; count--) {
            losses.put(1 + random.nextInt(32), loss());
        }
        return new Splitter(id, number(), word(), 1 + random.nextInt(2), 32, maybe(this::loss), losses);
    }

    private Joint joint(int id) {
        int count = 1 + random.nextInt(12);
        JointFacts facts = new JointFacts(
                maybe(this::word),
                maybe(() -> any(SpliceMethod.values())),
                maybe(this::loss),
                any(Trust.values()),
                maybe(this::date),
                maybe(this::date),
                maybe(this::word),
                maybe(this::date),
                maybe(this::word),
                maybe(this::length));
        return new Joint(id, any(JointKind.values()), number(), ends(count), ends(count), facts);
    }

    private Measurement measurement(int id) {
        return new Measurement(
                id,
                word(),
                wavelength(),
                maybe(() -> any(Direction.values())),
                loss(),
                maybe(this::date),
                maybe(this::word),
                maybe(this::word));
    }

    private FiberFlag fiberFlag(int id) {
        return new FiberFlag(
                id,
                number(),
                range(2),
                any(Flag.values()),
                maybe(this::number),
                maybe(this::number),
                maybe(this::word),
                maybe(this::word),
                maybe(this::date));
    }

    private Circuit circuit(int id) {
        List<Wavelength> wavelengths = new ArrayList<>(List.of(wavelength()));
        if (random.nextBoolean()) {
            wavelengths.add(wavelength());
        }
        return new Circuit(
                id,
                word(),
                maybe(this::word),
                maybe(this::word),
                1 + random.nextInt(5),
                random.nextInt(100),
                wavelengths,
                maybe(this::word),
                maybe(this::word),
                new PortRange(number(), range(2)),
                new PortRange(number(), range(2)),
                any(CircuitStatus.values()));
    }

    private BaseFeature baseFeature(int id) {
        Coordinate[] corners = {new Coordinate(8.5, 47), new Coordinate(random.nextDouble(), -0.1)};
        return new BaseFeature(id, word(), maybe(this::word), new GeometryFactory().createLineString(corners));
    }
}
