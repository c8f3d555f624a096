package spanwright.loss;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import org.jspecify.annotations.Nullable;
import spanwright.plant.Cable;
import spanwright.plant.CableValue;
import spanwright.plant.FiberType;
import spanwright.plant.FiberValues;
import spanwright.quantity.Loss;
import spanwright.quantity.Wavelength;
import spanwright.records.RecordsView;
import spanwright.splicing.Direction;
import spanwright.splicing.EndKey;
import spanwright.splicing.Measurement;
import spanwright.splicing.PlanningValue;
import spanwright.splicing.Splitter;
import spanwright.trace.Connector;
import spanwright.trace.Element;
import spanwright.trace.Fiber;
import spanwright.trace.Path;
import spanwright.trace.Splice;
import spanwright.trace.SplitterCrossing;

/**
 * Loss sums in decimal fractions, element by element, from the tables and sentences of records-folder.md section 3, typed
 * off by hand. It shares no code and no table with the reckoner.
 */
final class LossTwin {

    private static final MathContext EXACT = new MathContext(34);

    private static final String[] NANOMETRES =
            "1260 1270 1310 1383 1490 1529 1530 1550 1565 1566 1577 1625 1650".split(" ", -1);
    private static final String[] EXPECTED =
            "0.41 0.40 0.35 0.34 0.24 0.22 0.22 0.22 0.22 0.22 0.22 0.25 0.27".split(" ", -1);
    private static final String[] LIMIT =
            "0.50 0.50 0.40 0.40 0.40 0.40 0.30 0.30 0.30 0.40 0.40 0.40 0.45".split(" ", -1);

    private static final Map<String, String> PLANNING = Map.of(
            "splice.fusion", "0.10 0.30 0.05",
            "splice.mechanical", "0.20 0.30 0.10",
            "connector", "0.50 0.75 0.15",
            "splitter.2", "3.7 4.2 0",
            "splitter.4", "7.1 7.6 0",
            "splitter.8", "10.4 11.0 0",
            "splitter.16", "13.6 14.4 0",
            "splitter.32", "16.9 17.8 0",
            "splitter.64", "20.4 21.2 0",
            "splitter.128", "24.0 24.6 0");

    private final RecordsView records;
    private final BigDecimal nanometres;
    private final List<Measurement> measurements;

    BigDecimal expected = BigDecimal.ZERO;
    BigDecimal limit = BigDecimal.ZERO;
    private BigDecimal variance = BigDecimal.ZERO;
    boolean unknown;

    LossTwin(RecordsView records, Wavelength wavelength, Path path) {
        this.records = records;
        this.nanometres = wavelength.exactNanometres();
        this.measurements = records.measurements()
                .list()
                .filter(each -> each.wavelength().equals(wavelength))
                .toList();
        path.elements().forEach(this::add);
    }

    BigDecimal statistical() {
        BigDecimal spread = expected.add(BigDecimal.valueOf(3).multiply(variance.sqrt(EXACT)));
        return spread.min(limit);
    }

    private void add(Element element) {
        switch (element.kind()) {
            case FIBER -> addGlass(element, ((Fiber) element).cable());
            case JUMPER -> addGlass(element, null);
            case SPLICE -> addSplice((Splice) element);
            case CONNECTOR -> addJoint(List.of(((Connector) element).name()), null, "connector");
            case SPLITTER -> addSplitter((SplitterCrossing) element);
            case THROUGH -> {
                // Nothing is lost.
            }
        }
    }

    private void addGlass(Element element, @Nullable Cable cable) {
        String type = cable == null
                ? "G.652.D"
                : records.cableTypes().get(cable.cableType()).fiberType();
        BigDecimal perKm = cable == null ? null : at(reel(cable));
        if (perKm == null) {
            perKm = at(table(type, false));
        }
        BigDecimal most = at(table(type, true));
        if (perKm == null) {
            unknown = true;
            return;
        }
        BigDecimal km = element.glass().exactMetres().movePointLeft(3);
        expected = expected.add(km.multiply(perKm));
        limit = limit.add(km.multiply(most == null ? perKm : most));
    }

    /** A row of a table: wavelength and value. */
    private record Row(BigDecimal at, BigDecimal value) {}

    private List<Row> reel(Cable cable) {
        List<Row> rows = new ArrayList<>();
        for (CableValue value : records.cableValues().list().toList()) {
            Loss loss = value.lossPerKm();
            if (value.cable() == cable.id() && loss != null) {
                rows.add(new Row(value.wavelength().exactNanometres(), loss.exactDecibels()));
            }
        }
        return rows;
    }

    private List<Row> table(String code, boolean most) {
        List<Row> rows = new ArrayList<>();
        for (FiberType type : records.fiberTypes().list().toList()) {
            for (FiberValues row : type.code().equals(code) ? type.values() : List.<FiberValues>of()) {
                Loss loss = most ? row.lossLimitPerKm() : row.lossPerKm();
                rows.add(new Row(row.wavelength().exactNanometres(), loss.exactDecibels()));
            }
        }
        for (int index = 0; rows.size() <= index && index < NANOMETRES.length; index++) {
            rows.add(new Row(new BigDecimal(NANOMETRES[index]), new BigDecimal((most ? LIMIT : EXPECTED)[index])));
        }
        return rows;
    }

    private @Nullable BigDecimal at(List<Row> rows) {
        Row below = rows.stream()
                .filter(row -> row.at().compareTo(nanometres) <= 0)
                .max(Comparator.comparing(Row::at))
                .orElse(null);
        Row above = rows.stream()
                .filter(row -> row.at().compareTo(nanometres) >= 0)
                .min(Comparator.comparing(Row::at))
                .orElse(null);
        if (below == null || above == null) {
            return null;
        }
        if (below.at().compareTo(above.at()) == 0) {
            return below.value();
        }
        BigDecimal slope =
                above.value().subtract(below.value()).divide(above.at().subtract(below.at()), EXACT);
        return below.value().add(slope.multiply(nanometres.subtract(below.at())));
    }

    private void addSplice(Splice splice) {
        List<String> names = new ArrayList<>();
        for (long key : new long[] {splice.aKey(), splice.bKey()}) {
            String owner = EndKey.kind(key).name();
            if (!owner.equals("REAR")) {
                names.add((key == splice.aKey() ? splice.a() : splice.b()) + " @ "
                        + splice.enclosure().code());
            }
        }
        addJoint(
                names,
                splice.joint().facts().loss(),
                "splice." + splice.method().word());
    }

    private void addJoint(List<String> names, @Nullable Loss recorded, String item) {
        Measurement ab = latest(names, Direction.AB);
        Measurement ba = latest(names, Direction.BA);
        if (ab != null && ba != null) {
            addBoth(ab.loss().exactDecibels().add(ba.loss().exactDecibels()).divide(BigDecimal.valueOf(2)));
        } else if (recorded != null) {
            addBoth(recorded.exactDecibels());
        } else {
            addPlanned(item, true);
        }
    }

    private @Nullable Measurement latest(List<String> names, Direction direction) {
        Measurement latest = null;
        for (Measurement each : measurements) {
            boolean fits = names.contains(each.what()) && each.direction() == direction;
            if (fits && (latest == null || !before(each, latest))) {
                latest = each;
            }
        }
        return latest;
    }

    private static boolean before(Measurement one, Measurement other) {
        if (one.on() == null || other.on() == null) {
            return one.on() == null && other.on() != null;
        }
        return one.on().isBefore(other.on());
    }

    private void addBoth(BigDecimal loss) {
        expected = expected.add(loss);
        limit = limit.add(loss);
    }

    private void addPlanned(String item, boolean spreads) {
        PlanningValue own = records.planningValues()
                .list()
                .filter(value -> value.item().equals(item))
                .findFirst()
                .orElse(null);
        String[] table = Objects.requireNonNull(PLANNING.get(item), item).split(" ", -1);
        Loss most = own == null ? null : own.limit();
        Loss deviation = own == null ? null : own.sd();
        BigDecimal mean =
                own == null ? new BigDecimal(table[0]) : own.expected().exactDecibels();
        BigDecimal worst = own == null ? new BigDecimal(table[1]) : most == null ? mean : most.exactDecibels();
        BigDecimal sd = own == null
                ? new BigDecimal(table[2])
                : deviation == null ? BigDecimal.ZERO : deviation.exactDecibels();
        expected = expected.add(mean);
        limit = limit.add(worst);
        variance = spreads ? variance.add(sd.multiply(sd)) : variance;
    }

    private void addSplitter(SplitterCrossing crossing) {
        Splitter splitter = crossing.splitter();
        Loss tap = splitter.outputLosses().get(crossing.output());
        Loss measured = tap == null ? splitter.loss() : tap;
        if (measured != null) {
            addBoth(measured.exactDecibels());
        } else {
            addPlanned("splitter." + splitter.outputs(), false);
        }
    }
}
