package spanwright.answers;

import java.util.List;
import java.util.Optional;
import java.util.stream.LongStream;
import org.jspecify.annotations.Nullable;
import spanwright.atlas.Box;
import spanwright.circuits.Circuit;
import spanwright.circuits.CircuitStatus;
import spanwright.network.Block;
import spanwright.network.BlockKind;
import spanwright.quantity.Wavelength;
import spanwright.records.Records;
import spanwright.splicing.Joint;

/** What these records are: whose, of when, how many of each, where. */
public final class StatusDocument {

    private static final String INVENTED = "Every name, place and number here is invented.";

    private final Views views;
    private final String version;
    private final boolean demo;
    private final @Nullable Tile tile;

    /**
     * The status of a program's records.
     *
     * @param version version of the program
     * @param demo whether the records are those of the demo
     * @param tile the tile address that the operator named, or null
     */
    public StatusDocument(Views views, String version, boolean demo, @Nullable Tile tile) {
        this.views = views;
        this.version = version;
        this.demo = demo;
        this.tile = tile;
    }

    /** Writes its members. */
    public void write(Json json, View view, Changes changes) {
        json.text("program", "spanwright").text("version", version).text("owner", view.setting("owner"));
        String unit = view.setting("unit");
        json.text("unit", unit == null ? "m" : unit)
                .text("time_zone", view.zone().getId());
        changes.reference(json, "posting", views.ledger().findPosting(view.posting()));
        json.object("counts", item -> counts(item, view));
        extent(json, MapDocuments.extent(view.records()));
        boolean invented = demo || "yes".equals(view.setting("invented"));
        json.flag("demo", demo).text("invented", invented ? INVENTED : null);
        json.texts("jobs", view.records().plannedJobs());
        json.list(
                "wavelengths_nm",
                item -> wavelengths(view.records()).stream()
                        .map(Wavelength::exactNanometres)
                        .forEach(item::numberHere));
        if (tile == null) {
            json.none("tile");
        } else {
            json.object("tile", item -> item.text("url", tile.url).text("attribution", tile.attribution));
        }
    }

    private static void counts(Json json, View view) {
        Records records = view.records();
        json.whole("structures", records.structures().count())
                .whole("spans", records.spans().count());
        json.whole("cables", records.cables().count())
                .whole("enclosures", records.enclosures().count());
        json.whole("splitters", records.splitters().count())
                .whole("panels", records.panels().count());
        json.whole("joints", joints(records).sum())
                .whole("circuits", records.circuits().count());
        json.whole(
                "fiber_sections",
                view.network().blocks().stream()
                        .filter(block -> block.kind() == BlockKind.SECTION)
                        .mapToLong(Block::count)
                        .sum());
        json.whole("postings", view.posting());
    }

    private static LongStream joints(Records records) {
        return records.joints().list().filter(joint -> !joint.planned()).mapToLong(Joint::count);
    }

    private static void extent(Json json, Optional<Box> extent) {
        if (extent.isEmpty()) {
            json.none("extent");
            return;
        }
        Box box = extent.get();
        json.list(
                "extent",
                item -> item.degreesHere(box.west())
                        .degreesHere(box.south())
                        .degreesHere(box.east())
                        .degreesHere(box.north()));
    }

    private static List<Wavelength> wavelengths(Records records) {
        return records.circuits()
                .list()
                .filter(circuit -> circuit.status() != CircuitStatus.RETIRED)
                .map(Circuit::wavelengths)
                .flatMap(List::stream)
                .distinct()
                .sorted()
                .toList();
    }

    /**
     * Raster tiles that the operator named.
     *
     * @param url their address with {z}, {x}, {y}
     * @param attribution whose they are
     */
    public record Tile(String url, String attribution) {}
}
