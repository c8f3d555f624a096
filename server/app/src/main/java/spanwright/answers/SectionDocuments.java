package spanwright.answers;

import java.time.LocalDate;
import java.util.List;
import org.jspecify.annotations.Nullable;
import spanwright.circuits.Circuit;
import spanwright.network.Block;
import spanwright.planning.FiberUse;
import spanwright.planning.SectionUse;
import spanwright.plant.Enclosure;
import spanwright.plant.SheathPositions;
import spanwright.quantity.Length;
import spanwright.records.CableLay;
import spanwright.splicing.FiberFlag;

/** The sections of a cable, from its start on, each with what its fibers are used for. */
final class SectionDocuments {

    private final View view;
    private final CableLay lay;

    SectionDocuments(View view, CableLay lay) {
        this.view = view;
        this.lay = lay;
    }

    /** Writes one object a section. */
    void write(Json json) {
        List<Block> sections = view.network().sectionsOf(lay.cable().id());
        for (int index = 0; index < sections.size(); index++) {
            int place = index;
            json.objectHere(item -> section(item, place, sections.get(place)));
        }
    }

    private void section(Json json, int index, Block section) {
        int from = lay.index(section.fromRow());
        int to = lay.index(section.toRow());
        SheathPositions positions = lay.positions();
        Length begins = positions.enclosure(from);
        Length ends = positions.enclosure(to);
        json.whole("index", index);
        json.text("from", lay.findEnclosure(from).map(Enclosure::code).orElse(null));
        json.text("to", lay.findEnclosure(to).map(Enclosure::code).orElse(null));
        json.text("from_structure", lay.structure(from).code())
                .text("to_structure", lay.structure(to).code());
        json.metres("sheath_m", ends.minus(begins))
                .metres("route_m", lay.routeTo(to).minus(lay.routeTo(from)));
        json.text("length_basis", positions.basis(begins, ends).word());
        json.list(
                "uses",
                Alike.of(section.count(), fiber -> Said.of(view.uses().of(section, fiber))),
                (item, alike) -> alike.what().write(item.text("fibers", alike.numbers())));
    }

    /** What the chart of a cable says of a fiber. */
    private record Said(
            FiberUse use,
            @Nullable String circuit,
            int circuits,
            @Nullable String owner,
            @Nullable String reason,
            @Nullable LocalDate until,
            @Nullable LocalDate verifiedOn) {

        static Said of(SectionUse use) {
            FiberFlag flag = use.flag();
            return new Said(
                    use.use(),
                    use.circuits().stream().findFirst().map(Circuit::code).orElse(null),
                    use.circuits().size(),
                    flag == null ? null : flag.owner(),
                    flag == null ? null : flag.reason(),
                    flag == null ? null : flag.until(),
                    use.verifiedOn());
        }

        void write(Json json) {
            json.text("use", use.word()).text("circuit", circuit).whole("circuits_total", circuits);
            json.text("owner", owner).text("reason", reason).date("until", until);
            json.date("verified_on", verifiedOn);
        }
    }
}
