package spanwright.records;

import java.util.HashMap;
import java.util.Map;
import org.jspecify.annotations.Nullable;
import spanwright.plant.Cable;
import spanwright.plant.CableType;
import spanwright.plant.CableValue;
import spanwright.plant.RunRow;
import spanwright.plant.SheathMark;

/** The rules of cables, their types, their own values and the marks on their sheaths. */
final class CableRules {

    private final RecordsView view;
    /** A cable that is part of each longer cable named; made when first asked for. */
    private @Nullable Map<String, Integer> partsOf;

    CableRules(RecordsView view) {
        this.view = view;
    }

    /** A cable has changed: what is known may hold no longer. */
    void applied(@Nullable Cable before, @Nullable Cable after) {
        if (before != null && before.partOf() != null) {
            partsOf = null;
        } else if (partsOf != null && after != null && after.partOf() != null) {
            partsOf.putIfAbsent(after.partOf(), after.id());
        }
    }

    void ask(@Nullable Cable before, Cable cable, Refusals refusals) {
        String partOf = cable.partOf();
        if (partOf != null && partOf.equals(cable.code())) {
            refusals.add(
                    "part-of-itself",
                    "part_of",
                    "part_of '" + partOf
                            + "' is the cable's own code; name the longer cable that this reel is part of");
        } else if (partOf != null) {
            view.cables()
                    .find(partOf)
                    .ifPresent(other -> refusals.add(
                            "part-of-a-reel",
                            "part_of",
                            "part_of '" + partOf + "' is the code of a cable; a longer cable has a name of its own",
                            other));
        }
        Integer part = partsOf().get(cable.code());
        if (part != null && part != cable.id()) {
            refusals.add(
                    "code-of-longer-cable",
                    "cable",
                    "cable '" + cable.code() + "' is the name of a longer cable that others are part of; give this"
                            + " reel a code of its own",
                    view.cables().get(part));
        }
        if (before != null && fibers(before) > fibers(cable)) {
            refusals.add(
                    "fibers-lost",
                    "cable_type",
                    "cable " + cable.code() + " would have " + fibers(cable) + " fibers instead of " + fibers(before)
                            + "; name a type with as many or more, or enter another cable");
        }
    }

    private int fibers(Cable cable) {
        return view.cableTypes().get(cable.cableType()).fibers();
    }

    private Map<String, Integer> partsOf() {
        Map<String, Integer> known = partsOf;
        if (known == null) {
            Map<String, Integer> found = new HashMap<>();
            view.cables()
                    .list()
                    .filter(cable -> cable.partOf() != null)
                    .forEach(cable -> found.putIfAbsent(cable.partOf(), cable.id()));
            partsOf = found;
            known = found;
        }
        return known;
    }

    void ask(@Nullable CableType before, CableType type, Refusals refusals) {
        int cables = before == null ? 0 : view.owned(Relation.CABLE_TYPE_CABLES, type.id()).length;
        if (before != null && cables > 0 && before.fibers() > type.fibers()) {
            refusals.add(
                    "fibers-lost",
                    "fibers",
                    "cables of type " + type.code() + " have " + before.fibers() + " fibers, and " + type.fibers()
                            + " are fewer; give as many or more, or enter another type");
        }
    }

    void ask(CableValue value, Refusals refusals) {
        view.cableValues()
                .owned(Relation.CABLE_VALUES, value.cable())
                .filter(other -> other.id() != value.id() && other.wavelength().equals(value.wavelength()))
                .findFirst()
                .ifPresent(other -> refusals.add(
                        "wavelength-twice",
                        "wavelength_nm",
                        "cable " + Names.cable(view, value.cable()) + " has values at " + value.wavelength()
                                + " already; a wavelength stands once a cable",
                        other));
    }

    void ask(SheathMark mark, Refusals refusals) {
        RunRow row = view.runRows().get(mark.runRow());
        view.sheathMarks()
                .owned(Relation.RUN_ROW_MARKS, mark.runRow())
                .filter(other -> other.id() != mark.id() && other.ink().equals(mark.ink()))
                .findFirst()
                .ifPresent(other -> refusals.add(
                        "mark-twice",
                        "ink",
                        "the " + mark.ink() + " marks of " + Names.of(view, row)
                                + " are there already; each ink stands once a run row",
                        other));
        view.runRows()
                .owned(Relation.CABLE_RUN_ROWS, row.cable())
                .flatMap(one -> view.sheathMarks().owned(Relation.RUN_ROW_MARKS, one.id()))
                .filter(other ->
                        other.id() != mark.id() && other.ink().equals(mark.ink()) && other.unit() != mark.unit())
                .findFirst()
                .ifPresent(other -> refusals.add(
                        "two-units-in-one-ink",
                        "unit",
                        "the " + mark.ink() + " marks of cable " + Names.cable(view, row.cable()) + " are in "
                                + other.unit().symbol() + " elsewhere; one ink of a cable has one unit",
                        other));
    }
}
