package spanwright.answers;

import java.util.Comparator;
import java.util.List;
import org.jspecify.annotations.Nullable;
import spanwright.circuits.Circuit;
import spanwright.circuits.PortRange;
import spanwright.journal.RecordKind;
import spanwright.plant.Enclosure;
import spanwright.plant.Structure;
import spanwright.quantity.Wavelength;

/** The documents of one circuit and of a page of circuits. */
public final class CircuitDocuments {

    private final View view;

    /** Of what a view shows. */
    public CircuitDocuments(View view) {
        this.view = view;
    }

    /** A circuit, with where its ends are and which circuits protect it. */
    public void one(Json json, Circuit circuit, Changes changes) {
        summary(json, circuit);
        place(json, "a_at", circuit.a());
        place(json, "z_at", circuit.z());
        json.texts("partners", partners(circuit));
        changes.write(json, "changed", RecordKind.CIRCUIT, circuit.id());
        json.whole("posting", view.posting());
    }

    private List<String> partners(Circuit circuit) {
        String group = circuit.protectionGroup();
        return group == null
                ? List.of()
                : view.records()
                        .circuits()
                        .list()
                        .filter(other -> group.equals(other.protectionGroup()) && other.id() != circuit.id())
                        .map(Circuit::code)
                        .sorted()
                        .toList();
    }

    private void place(Json json, String name, PortRange ports) {
        Enclosure enclosure = view.records()
                .enclosures()
                .get(view.records().panels().get(ports.panel()).enclosure());
        Structure structure = view.records().structures().get(enclosure.structure());
        json.object(
                name,
                item -> item.text("port", view.names().ports(ports.panel(), ports.ports()))
                        .text("enclosure", enclosure.code())
                        .text("structure", structure.code())
                        .place(structure.position()));
    }

    private void summary(Json json, Circuit circuit) {
        json.text("circuit", circuit.code()).text("service", circuit.service()).text("customer", circuit.customer());
        json.whole("priority", circuit.priority()).whole("customers_served", circuit.customersServed());
        json.list(
                "wavelengths_nm",
                item -> circuit.wavelengths().stream()
                        .map(Wavelength::exactNanometres)
                        .forEach(item::numberHere));
        json.text("budget", circuit.budget()).text("protection_group", circuit.protectionGroup());
        json.text("status", circuit.status().word());
        json.text("a", view.names().ports(circuit.a().panel(), circuit.a().ports()));
        json.text("z", view.names().ports(circuit.z().panel(), circuit.z().ports()));
    }

    /**
     * Circuits by code.
     *
     * @param prefix only codes that begin so, upper and lower case alike
     * @param after only codes after this one, or null
     * @param limit how many at most
     */
    public void page(Json json, String prefix, @Nullable String after, int limit) {
        List<Circuit> matching = view.records()
                .circuits()
                .list()
                .filter(circuit -> circuit.code().regionMatches(true, 0, prefix, 0, prefix.length()))
                .sorted(Comparator.comparing(Circuit::code))
                .toList();
        List<Circuit> page = matching.stream()
                .filter(circuit -> after == null || circuit.code().compareTo(after) > 0)
                .limit(limit + 1L)
                .toList();
        boolean more = page.size() > limit;
        List<Circuit> shown = more ? page.subList(0, limit) : page;
        json.list("circuits", shown, this::summary);
        json.text("next", more ? shown.get(limit - 1).code() : null);
        json.whole("total", matching.size()).whole("posting", view.posting());
    }
}
