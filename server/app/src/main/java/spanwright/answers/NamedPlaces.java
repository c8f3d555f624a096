package spanwright.answers;

import java.util.List;
import java.util.Objects;
import org.jspecify.annotations.Nullable;
import org.locationtech.jts.geom.Coordinate;
import spanwright.atlas.LineOf;
import spanwright.atlas.Match;
import spanwright.circuits.Circuit;
import spanwright.plant.BaseFeature;
import spanwright.plant.Cable;
import spanwright.plant.Enclosure;
import spanwright.plant.Position;
import spanwright.plant.RunRow;
import spanwright.plant.Span;
import spanwright.plant.Structure;
import spanwright.records.Records;
import spanwright.splicing.Panel;
import spanwright.splicing.Splitter;

/** Says what something found by its name is, and where. */
final class NamedPlaces {

    private final View view;
    private final Records records;

    NamedPlaces(View view) {
        this.view = view;
        this.records = view.records();
    }

    Found found(Match match) {
        return switch (match.named()) {
            case CIRCUIT -> circuit(records.circuits().get(match.id()), false);
            case CUSTOMER -> circuit(records.circuits().get(match.id()), true);
            case CABLE -> cable(records.cables().get(match.id()));
            case ENCLOSURE -> enclosure(records.enclosures().get(match.id()));
            case STRUCTURE -> structure(records.structures().get(match.id()), false);
            case ADDRESS -> structure(records.structures().get(match.id()), true);
            case PANEL -> panel(records.panels().get(match.id()));
            case SPLITTER -> splitter(records.splitters().get(match.id()));
            case SPAN -> span(records.spans().get(match.id()));
            case PLACE -> place(records.baseFeatures().get(match.id()));
        };
    }

    private Found circuit(Circuit circuit, boolean byCustomer) {
        Enclosure a = enclosureOf(circuit.a().panel());
        Enclosure z = enclosureOf(circuit.z().panel());
        String where = view.structure(a.structure()) + " to " + view.structure(z.structure());
        String customer = Objects.requireNonNullElse(circuit.customer(), "");
        String service = circuit.service() == null ? "" : ", " + circuit.service();
        String what = circuit.status().word() + " circuit" + service;
        return byCustomer
                ? new Found("customer", customer, what + " " + circuit.code(), where, "circuit", circuit.code(), at(z))
                : new Found(
                        "circuit",
                        circuit.code(),
                        customer.isEmpty() ? what : what + ", " + customer,
                        where,
                        "circuit",
                        circuit.code(),
                        at(z));
    }

    private Enclosure enclosureOf(int panel) {
        return records.enclosures().get(records.panels().get(panel).enclosure());
    }

    private Position at(Enclosure enclosure) {
        return records.structures().get(enclosure.structure()).position();
    }

    private Found cable(Cable cable) {
        List<RunRow> run = records.runOf(cable.id());
        Structure from = records.structures().get(run.get(0).structure());
        Structure to = records.structures().get(run.get(run.size() - 1).structure());
        String part = cable.partOf() == null ? "" : " of " + cable.partOf();
        String what = records.cableTypes().get(cable.cableType()).fibers() + "-fiber cable" + part;
        Position middle =
                records.structures().get(run.get(run.size() / 2).structure()).position();
        return new Found("cable", cable.code(), what, from.code() + " to " + to.code(), "cable", cable.code(), middle);
    }

    private Found enclosure(Enclosure enclosure) {
        Structure structure = records.structures().get(enclosure.structure());
        return new Found(
                "enclosure",
                enclosure.code(),
                enclosure.type().word(),
                describe(structure),
                "enclosure",
                enclosure.code(),
                structure.position());
    }

    private Found structure(Structure structure, boolean byAddress) {
        String address = structure.address();
        if (byAddress && address != null) {
            return new Found(
                    "address",
                    address,
                    structure.type().word() + " " + structure.code(),
                    structure.code(),
                    "structure",
                    structure.code(),
                    structure.position());
        }
        return new Found(
                "structure",
                structure.code(),
                structure.type().word(),
                address == null ? "" : address,
                "structure",
                structure.code(),
                structure.position());
    }

    private Found panel(Panel panel) {
        Enclosure enclosure = records.enclosures().get(panel.enclosure());
        return new Found(
                "panel",
                enclosure.code() + "/" + panel.code(),
                "panel of " + panel.ports() + " ports",
                enclosure.code() + " at " + view.structure(enclosure.structure()),
                "enclosure",
                enclosure.code(),
                at(enclosure));
    }

    private Found splitter(Splitter splitter) {
        Enclosure enclosure = records.enclosures().get(splitter.enclosure());
        return new Found(
                "splitter",
                enclosure.code() + "/" + splitter.code(),
                "splitter of " + splitter.outputs() + " outputs",
                enclosure.code() + " at " + view.structure(enclosure.structure()),
                "enclosure",
                enclosure.code(),
                at(enclosure));
    }

    private Found span(Span span) {
        List<Position> line = LineOf.span(records, span);
        String where = view.structure(span.from()) + " to " + view.structure(span.to());
        return new Found(
                "span",
                span.code(),
                span.placement().word() + " span",
                where,
                "span",
                span.code(),
                line.get(line.size() / 2));
    }

    private static Found place(BaseFeature feature) {
        Coordinate middle = feature.geometry().getInteriorPoint().getCoordinate();
        return new Found(
                "place",
                Objects.requireNonNullElse(feature.name(), ""),
                feature.layer(),
                "base map",
                "map",
                null,
                position(middle));
    }

    private static @Nullable Position position(@Nullable Coordinate at) {
        return at == null ? null : new Position(at.x, at.y);
    }

    private static String describe(Structure structure) {
        String address = structure.address() == null ? "" : ", " + structure.address();
        return structure.type().word() + " " + structure.code() + address;
    }
}
