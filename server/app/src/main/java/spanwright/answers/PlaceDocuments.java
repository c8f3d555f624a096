package spanwright.answers;

import java.util.ArrayList;
import java.util.Collections;
import java.util.Comparator;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import spanwright.atlas.FibersOf;
import spanwright.circuits.CircuitStatus;
import spanwright.journal.RecordKind;
import spanwright.network.Block;
import spanwright.plant.Enclosure;
import spanwright.plant.LengthBasis;
import spanwright.plant.Position;
import spanwright.plant.RouteLength;
import spanwright.plant.RunRow;
import spanwright.plant.Span;
import spanwright.plant.Structure;
import spanwright.records.CableLay;
import spanwright.records.Relation;

/** The documents of a structure and of a span. */
public final class PlaceDocuments {

    private final View view;
    private final Changes changes;

    /** Of what a view shows. */
    public PlaceDocuments(View view, Changes changes) {
        this.view = view;
        this.changes = changes;
    }

    /** A structure, with the enclosures in it, the spans that leave it and the cables that visit it. */
    public void structure(Json json, Structure structure) {
        json.text("code", structure.code()).text("kind", structure.type().word());
        json.place(structure.position()).metres("accuracy_m", structure.accuracy());
        json.text("address", structure.address())
                .text("state", structure.state().word());
        json.texts("shared_risk", structure.sharedRisk()).text("note", structure.note());
        json.list("enclosures", enclosuresAt(structure), this::enclosure);
        json.list("spans", spansAt(structure), (item, span) -> spanAt(item, structure, span));
        json.list("cables", rowsAt(structure), this::rowHere);
        changes.write(json, "changed", RecordKind.STRUCTURE, structure.id());
        json.whole("posting", view.posting());
    }

    private List<Enclosure> enclosuresAt(Structure structure) {
        return view.records()
                .enclosures()
                .owned(Relation.STRUCTURE_ENCLOSURES, structure.id())
                .sorted(Comparator.comparing(Enclosure::code))
                .toList();
    }

    private void enclosure(Json json, Enclosure enclosure) {
        json.text("enclosure", enclosure.code()).text("kind", enclosure.type().word());
        json.text("state", enclosure.state().word());
        json.whole("cables", view.records().owned(Relation.ENCLOSURE_PASSES, enclosure.id()).length);
    }

    private List<Span> spansAt(Structure structure) {
        return view.records()
                .spans()
                .owned(Relation.STRUCTURE_SPANS, structure.id())
                .sorted(Comparator.comparing(Span::code))
                .toList();
    }

    private void spanAt(Json json, Structure structure, Span span) {
        RouteLength route = route(span);
        boolean onward = span.from() == structure.id();
        List<Position> line = new ArrayList<>(route.line().positions());
        if (!onward) {
            Collections.reverse(line);
        }
        json.text("span", span.code()).text("to", view.structure(onward ? span.to() : span.from()));
        json.text("placement", span.placement().word())
                .text("state", span.state().word());
        json.metres("length_m", route.length())
                .text("length_basis", route.basis().word());
        json.number("bearing_deg", Bearing.leaving(line));
        List<RunRow> rows = rowsOn(span);
        json.whole("cables", rows.stream().map(RunRow::cable).distinct().count());
        json.whole("fibers", FibersOf.span(view.records(), span.id()));
    }

    private RouteLength route(Span span) {
        return RouteLength.of(
                span,
                view.records().structures().get(span.from()).position(),
                view.records().structures().get(span.to()).position());
    }

    private List<RunRow> rowsAt(Structure structure) {
        return inOrder(view.records()
                .runRows()
                .owned(Relation.STRUCTURE_RUN_ROWS, structure.id())
                .toList());
    }

    private List<RunRow> rowsOn(Span span) {
        return inOrder(view.records()
                .runRows()
                .owned(Relation.SPAN_RUN_ROWS, span.id())
                .toList());
    }

    private List<RunRow> inOrder(List<RunRow> rows) {
        return rows.stream()
                .sorted(Comparator.comparing((RunRow row) -> view.cable(row.cable()))
                        .thenComparing(RunRow::seq))
                .toList();
    }

    private void rowHere(Json json, RunRow row) {
        CableLay lay = view.lay(row.cable());
        json.text("cable", view.cable(row.cable())).whole("seq", row.seq());
        json.text("enclosure", lay.findEnclosure(row.seq()).map(Enclosure::code).orElse(null));
        RunRowDocument.positions(json, lay, row);
        RunRowDocument.slack(json, row);
        RunRowDocument.marks(json, view, row, lay.cable().marksInk());
    }

    /** A span, with the cables that lie on it. */
    public void span(Json json, Span span) {
        RouteLength route = route(span);
        json.text("code", span.code()).text("from", view.structure(span.from())).text("to", view.structure(span.to()));
        json.text("placement", span.placement().word())
                .text("state", span.state().word());
        json.metres("length_m", route.length())
                .text("length_basis", route.basis().word());
        if (span.from() == span.to() && span.line() == null) {
            json.none("line");
        } else {
            json.list("line", item -> route.line().positions().forEach(item::positionHere));
        }
        json.texts("shared_risk", span.sharedRisk()).text("note", span.note());
        Set<String> circuits = new HashSet<>();
        json.list("cables", rowsOn(span), (item, row) -> cableOn(item, row, circuits));
        json.whole("circuits", circuits.size());
        changes.write(json, "changed", RecordKind.SPAN, span.id());
        json.whole("posting", view.posting());
    }

    private void cableOn(Json json, RunRow row, Set<String> circuits) {
        CableLay lay = view.lay(row.cable());
        int seq = row.seq();
        json.text("cable", lay.cable().code()).whole("seq", seq).text("duct", row.duct());
        json.whole("fibers", lay.type().fibers());
        json.metres("sheath_m", lay.positions().in(seq).minus(lay.positions().out(seq - 1)));
        LengthBasis basis = lay.positions()
                .basis(lay.positions().out(seq - 1), lay.positions().in(seq));
        json.text("sheath_basis", basis.word());
        UseCounts counts = new UseCounts();
        for (Block section : view.network().sectionsOf(row.cable())) {
            if (lay.index(section.fromRow()) < seq && seq <= lay.index(section.toRow())) {
                for (int fiber = 1; fiber <= section.count(); fiber++) {
                    counts.add(view.uses().of(section, fiber).use());
                    view.uses().circuits().through(section.piece(fiber)).stream()
                            .filter(circuit -> circuit.status() == CircuitStatus.WORKING)
                            .forEach(circuit -> circuits.add(circuit.code()));
                }
            }
        }
        json.object("uses", counts::write).text("state", lay.cable().state().word());
    }
}
