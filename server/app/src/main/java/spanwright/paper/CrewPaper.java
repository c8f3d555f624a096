package spanwright.paper;

import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.Set;
import org.jspecify.annotations.Nullable;
import spanwright.answers.View;
import spanwright.plant.Enclosure;
import spanwright.plant.Placement;
import spanwright.plant.PrintedMark;
import spanwright.plant.SheathPlace;
import spanwright.plant.SheathPositions;
import spanwright.plant.Span;
import spanwright.plant.Structure;
import spanwright.plant.StructureKind;
import spanwright.quantity.Length;
import spanwright.records.CableLay;

/** The page that a crew takes to a fault place: where it is, what to look for there, what may hurt, room to write. */
public final class CrewPaper {

    private static final double WIDE = 189;
    private static final List<String> TO_WRITE =
            List.of("Found at mark", "Cause", "Dig ticket no.", "On site (time)", "All light (time)", "Names");

    private final View view;
    private final CrewPlace place;
    private final PlaceWords words;

    /** Of a place. */
    public CrewPaper(View view, CrewPlace place) {
        this.view = view;
        this.place = place;
        this.words = new PlaceWords(view);
    }

    /**
     * The document, of one page.
     *
     * @param self the address of this paper as PDF, or empty
     */
    public String html(Stamp stamp, PaperSize size, String self) {
        Sheets sheets = new Sheets("Crew's page", title(), stamp, size);
        sheets.add(within(), this::body);
        return sheets.document(self);
    }

    /** The place in words. */
    public String title() {
        CableLay lay = place.lay();
        Length sheath = place.sheath();
        Structure at = place.at();
        return lay == null || sheath == null
                ? "In a jumper at " + (at == null ? "" : at.code())
                : words.at(lay, sheath);
    }

    private String within() {
        Length within = place.within();
        return within == null
                ? "How near this is to the true place is not stated"
                : "Within " + words.length(within) + " either side along the sheath, in about 95 of 100";
    }

    private void body(Html html) {
        new PlaceMap(view, place, html).write();
        html.open("div", "class", "beside");
        SquareCode.write(html, place.position());
        html.element("p", position());
        html.close();
        html.open("div", "class", "facts");
        facts().forEach(fact -> fact(html, fact));
        html.close();
        html.open("div", "class", "cautions");
        cautions().forEach(caution -> fact(html, caution));
        html.close();
        html.open("div", "class", "writing");
        for (String each : TO_WRITE) {
            html.element("p", each);
        }
        html.close();
    }

    private String position() {
        return String.format(
                Locale.ROOT,
                "%.6f, %.6f WGS 84",
                place.position().lat(),
                place.position().lon());
    }

    private static void fact(Html html, Fact fact) {
        html.open("p", "class", "fact");
        List<String> lines = Sheets.lines(fact.word() + ": " + fact.says(), fact.wide() ? WIDE : WIDE - 36, 8.6, 2);
        Sheets.set(html, lines);
        html.close();
    }

    private List<Fact> facts() {
        List<Fact> facts = new ArrayList<>();
        CableLay lay = place.lay();
        Length sheath = place.sheath();
        if (lay != null && sheath != null) {
            marks(lay, sheath).ifPresent(facts::add);
            Integer fiber = place.fiber();
            facts.add(new Fact(
                    "Cable",
                    lay.cable().code() + " (" + lay.type().code() + ", "
                            + lay.type().fibers() + " fibers)"
                            + (fiber == null ? "" : ", fiber " + fiber + " was shot"),
                    false));
            facts.add(new Fact("Back, toward the cable's start", neighbours(lay, sheath, -1), false));
            facts.add(new Fact("Ahead, toward its end", neighbours(lay, sheath, 1), false));
            facts.add(new Fact("Coils near", coils(lay, sheath), false));
        }
        return facts;
    }

    private Optional<Fact> marks(CableLay lay, Length sheath) {
        Optional<PrintedMark> here = lay.positions().findMark(sheath);
        Length within = place.within();
        if (here.isEmpty()) {
            return Optional.of(
                    new Fact("Marks", "no two marks of " + lay.cable().code() + " were read", false));
        }
        String said = PlaceWords.mark(here.get()) + ", " + lay.cable().marksInk() + " ink";
        if (within != null) {
            Length end = lay.positions().length();
            Length from = clamp(sheath.minus(within), end);
            Length to = clamp(sheath.plus(within), end);
            said += "; look from "
                    + lay.positions().findMark(from).map(PlaceWords::mark).orElse("") + " to "
                    + lay.positions().findMark(to).map(PlaceWords::mark).orElse("");
        }
        return Optional.of(new Fact("Mark on the sheath", said, false));
    }

    private static Length clamp(Length position, Length end) {
        if (position.compareTo(Length.ZERO) < 0) {
            return Length.ZERO;
        }
        return position.compareTo(end) > 0 ? end : position;
    }

    /** The route position of a place along a cable's run. */
    static Length route(CableLay lay, Length sheath) {
        SheathPlace spot = lay.positions().place(sheath);
        return spot.onSpan()
                ? lay.routeTo(spot.row() - 1)
                        .plus(lay.route(spot.row()).length().times(spot.fraction()))
                : lay.routeTo(spot.row());
    }

    /** The nearest structure and the nearest enclosure one way, with how far they are by route. */
    private String neighbours(CableLay lay, Length sheath, int way) {
        SheathPlace spot = lay.positions().place(sheath);
        Length here = route(lay, sheath);
        int row = way < 0 ? spot.onSpan() ? spot.row() - 1 : spot.row() : spot.row();
        if (row < 0 || row >= lay.rows().size()) {
            return "the cable ends here";
        }
        Structure next = lay.structure(row);
        String said = next.type().word() + " " + next.code() + " " + far(lay, here, row)
                + (next.address() == null ? "" : " (" + next.address() + ")");
        while (row >= 0 && row < lay.rows().size()) {
            Optional<Enclosure> enclosure = lay.findEnclosure(row);
            if (enclosure.isPresent()) {
                return said + "; " + enclosure.get().type().word() + " "
                        + enclosure.get().code() + " at " + lay.structure(row).code() + " " + far(lay, here, row);
            }
            row += way;
        }
        return said + "; no enclosure that way";
    }

    private String far(CableLay lay, Length here, int row) {
        return words.length(lay.routeTo(row).minus(here).abs()) + " by route";
    }

    private String coils(CableLay lay, Length sheath) {
        SheathPositions positions = lay.positions();
        SheathPlace spot = positions.place(sheath);
        List<String> said = new ArrayList<>();
        for (int row = Math.max(0, spot.row() - 2); row <= Math.min(spot.row() + 2, positions.rows() - 1); row++) {
            if (positions.coil(row).compareTo(Length.ZERO) > 0) {
                said.add(words.length(positions.coil(row)) + " at "
                        + lay.structure(row).code());
            }
        }
        return said.isEmpty() ? "none recorded within two structures" : String.join(", ", said);
    }

    private List<Fact> cautions() {
        List<Fact> said = new ArrayList<>();
        hazards().ifPresent(said::add);
        said.add(new Fact(
                "Light",
                "infrared, unseen, harms eyes: meter before you look; never look into an open end, with a magnifier least of"
                        + " all. Trap scraps of glass.",
                true));
        said.add(new Fact(
                "Digging",
                "a ticket with the one-call center (811 in the United States) and marks on the ground first; hand-dig near"
                        + " them. This page is a record, not a locate.",
                true));
        said.add(new Fact(
                "Poles, manholes, traffic",
                "power above: keep distance, lower no one else's cable. Test manholes for gas before and while inside; guard"
                        + " the opening. Set out signs and cones first.",
                true));
        said.add(new Fact("Rules", "Local codes and licensed practice prevail over anything said here.", true));
        return said;
    }

    private Optional<Fact> hazards() {
        Set<String> known = new LinkedHashSet<>();
        CableLay lay = place.lay();
        Length sheath = place.sheath();
        if (lay != null && sheath != null) {
            SheathPlace spot = lay.positions().place(sheath);
            Span span = span(lay, spot);
            if (span != null) {
                known.add(
                        span.placement() == Placement.AERIAL
                                ? "aerial span, power above"
                                : span.placement().word() + " span");
                known.addAll(span.sharedRisk());
                known.add(span.note() == null ? "" : span.note());
            }
            for (int row = Math.max(0, spot.row() - 1); row <= spot.row(); row++) {
                Structure structure = lay.structure(row);
                if (structure.type() == StructureKind.MANHOLE || structure.type() == StructureKind.VAULT) {
                    known.add(structure.type().word() + " " + structure.code() + ": confined space");
                }
                known.addAll(structure.sharedRisk());
                known.add(structure.note() == null ? "" : structure.note());
            }
        }
        known.remove("");
        return known.isEmpty() ? Optional.empty() : Optional.of(new Fact("Known here", String.join("; ", known), true));
    }

    private @Nullable Span span(CableLay lay, SheathPlace spot) {
        Integer id = spot.onSpan() ? lay.rows().get(spot.row()).span() : null;
        return id == null ? null : view.records().spans().get(id);
    }

    /** Something said, under its word; narrow beside the square code. */
    private record Fact(String word, String says, boolean wide) {}
}
