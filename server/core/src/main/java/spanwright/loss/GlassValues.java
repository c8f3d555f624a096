package spanwright.loss;

import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.Function;
import org.jspecify.annotations.Nullable;
import spanwright.plant.BuiltInFiberTypes;
import spanwright.plant.Cable;
import spanwright.plant.CableValue;
import spanwright.plant.FiberType;
import spanwright.plant.FiberValues;
import spanwright.quantity.Loss;
import spanwright.quantity.Wavelength;
import spanwright.records.Catalogue;
import spanwright.records.RecordsView;
import spanwright.records.Relation;

/**
 * Loss and group index of glass by wavelength. A reel's own sheet goes before the table of its fiber type wherever the
 * sheet reaches; both are linear between their wavelengths, and outside there is no value. One thread's.
 */
public final class GlassValues {

    /** The fiber type of jumpers. */
    static final String JUMPER_TYPE = "G.652.D";

    private final RecordsView records;
    private final Catalogue catalogue;
    private final Map<String, TypeCurves> types = new HashMap<>();
    private final Map<Integer, ReelCurves> reels = new HashMap<>();
    private final Map<LitCable, Optional<TableValue>> losses = new HashMap<>();

    /** The values of glass in these records. */
    public GlassValues(RecordsView records) {
        this.records = records;
        this.catalogue = new Catalogue(records);
    }

    /** The table of a fiber type. */
    private record TypeCurves(FiberType type, Curve loss, Curve limit, Curve index) {

        static TypeCurves of(FiberType type) {
            return new TypeCurves(
                    type,
                    curve(type, row -> row.lossPerKm().decibels()),
                    curve(type, row -> row.lossLimitPerKm().decibels()),
                    curve(type, FiberValues::groupIndex));
        }

        private static Curve curve(FiberType type, Function<FiberValues, @Nullable Double> value) {
            return Curve.of(type.values(), FiberValues::wavelength, value);
        }
    }

    /** The sheet of one reel. */
    private record ReelCurves(List<CableValue> rows, Curve loss, Curve index) {

        static ReelCurves of(List<CableValue> rows) {
            return new ReelCurves(
                    rows,
                    Curve.of(rows, CableValue::wavelength, row -> decibels(row.lossPerKm())),
                    Curve.of(rows, CableValue::wavelength, CableValue::groupIndex));
        }

        private static @Nullable Double decibels(@Nullable Loss loss) {
            return loss == null ? null : Double.valueOf(loss.decibels());
        }
    }

    /** A cable at a wavelength. */
    private record LitCable(int cable, Wavelength wavelength) {}

    /** Expected loss of a cable's glass in dB/km; none outside of its tables. */
    public Optional<TableValue> findLoss(Cable cable, Wavelength wavelength) {
        return losses.computeIfAbsent(new LitCable(cable.id(), wavelength), key -> reckonLoss(cable, wavelength));
    }

    private Optional<TableValue> reckonLoss(Cable cable, Wavelength wavelength) {
        return ofReel(cable, reel(cable).loss().at(wavelength)).or(() -> findLoss(typeOf(cable), wavelength));
    }

    /** The most a cable's glass may lose in dB/km, by its type; where only its reel's sheet reaches, what that says. */
    public Optional<TableValue> findLimit(Cable cable, Wavelength wavelength) {
        return findLimit(typeOf(cable), wavelength)
                .or(() -> ofReel(cable, reel(cable).loss().at(wavelength)));
    }

    /** Group index of a cable's glass; none outside of its tables. */
    public Optional<TableValue> findIndex(Cable cable, Wavelength wavelength) {
        TypeCurves type = curves(typeOf(cable));
        return ofReel(cable, reel(cable).index().at(wavelength))
                .or(() -> type.index().at(wavelength).map(reading -> ofType(type, reading, Column.INDEX)));
    }

    /** Expected loss of a jumper's glass in dB/km; none outside of the table. */
    public Optional<TableValue> findJumperLoss(Wavelength wavelength) {
        return findLoss(JUMPER_TYPE, wavelength);
    }

    /** The most a jumper's glass may lose in dB/km; none outside of the table. */
    public Optional<TableValue> findJumperLimit(Wavelength wavelength) {
        return findLimit(JUMPER_TYPE, wavelength);
    }

    /** Group index of a jumper's glass; none outside of the table. */
    public Optional<TableValue> findJumperIndex(Wavelength wavelength) {
        TypeCurves type = curves(JUMPER_TYPE);
        return type.index().at(wavelength).map(reading -> ofType(type, reading, Column.INDEX));
    }

    private Optional<TableValue> findLoss(String code, Wavelength wavelength) {
        TypeCurves type = curves(code);
        return type.loss().at(wavelength).map(reading -> ofType(type, reading, Column.LOSS));
    }

    private Optional<TableValue> findLimit(String code, Wavelength wavelength) {
        TypeCurves type = curves(code);
        return type.limit().at(wavelength).map(reading -> ofType(type, reading, Column.LIMIT));
    }

    /** Which value of a row. */
    private enum Column {
        LOSS,
        LIMIT,
        INDEX
    }

    private static TableValue ofType(TypeCurves curves, Curve.Reading reading, Column column) {
        String code = curves.type().code();
        boolean builtIn = curves.type().id() == 0;
        String origin = builtIn ? ": " + builtInSource(code, reading.below(), column) : ", from these records";
        return new TableValue(reading.value(), LossBasis.TYPE, "Fiber type " + code + " " + reading.where() + origin);
    }

    private static String builtInSource(String code, Wavelength wavelength, Column column) {
        return BuiltInFiberTypes.findSources(code, wavelength)
                .map(sources -> switch (column) {
                    case LOSS -> sources.loss().text();
                    case LIMIT -> sources.limit().text();
                    case INDEX -> sources.index().text();
                })
                .orElseThrow();
    }

    private Optional<TableValue> ofReel(Cable cable, Optional<Curve.Reading> reading) {
        return reading.map(found -> new TableValue(
                found.value(),
                LossBasis.SHEET,
                "Reel sheet of " + cable.code() + " " + found.where() + sheet(cable, found.below())));
    }

    private String sheet(Cable cable, Wavelength wavelength) {
        return reel(cable).rows().stream()
                .filter(row -> row.wavelength().equals(wavelength))
                .map(CableValue::source)
                .filter(source -> source != null)
                .map(source -> ": " + source)
                .findFirst()
                .orElse("");
    }

    /** Why a cable has no loss at a wavelength, for a person. */
    public String whyNoLoss(Cable cable, Wavelength wavelength) {
        return whyNot(typeOf(cable), "loss", curves(typeOf(cable)).loss(), wavelength) + "; give " + cable.code()
                + " a value of its own, or the type a row";
    }

    /** Why a cable has no group index at a wavelength, for a person. */
    public String whyNoIndex(Cable cable, Wavelength wavelength) {
        return whyNot(typeOf(cable), "group index", curves(typeOf(cable)).index(), wavelength) + "; give "
                + cable.code() + " a value of its own, or the type a row";
    }

    /** Why jumpers have no loss at a wavelength, for a person. */
    public String whyNoJumperLoss(Wavelength wavelength) {
        return whyNot(JUMPER_TYPE, "loss", curves(JUMPER_TYPE).loss(), wavelength) + "; give the type a row";
    }

    /** Why jumpers have no group index at a wavelength, for a person. */
    public String whyNoJumperIndex(Wavelength wavelength) {
        return whyNot(JUMPER_TYPE, "group index", curves(JUMPER_TYPE).index(), wavelength) + "; give the type a row";
    }

    private static String whyNot(String type, String what, Curve curve, Wavelength wavelength) {
        return "fiber type " + type + " gives no " + what + " at " + wavelength + ": its table reaches "
                + curve.reach();
    }

    /** The fiber type of a cable. */
    public FiberType type(Cable cable) {
        return curves(typeOf(cable)).type();
    }

    /** The fiber type of jumpers. */
    public FiberType jumperType() {
        return curves(JUMPER_TYPE).type();
    }

    private String typeOf(Cable cable) {
        return records.cableTypes().get(cable.cableType()).fiberType();
    }

    private TypeCurves curves(String code) {
        return types.computeIfAbsent(
                code, key -> TypeCurves.of(catalogue.findFiberType(key).orElseThrow()));
    }

    private ReelCurves reel(Cable cable) {
        return reels.computeIfAbsent(
                cable.id(),
                id -> ReelCurves.of(
                        records.cableValues().owned(Relation.CABLE_VALUES, id).toList()));
    }
}
