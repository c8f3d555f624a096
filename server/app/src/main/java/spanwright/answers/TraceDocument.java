package spanwright.answers;

import java.util.List;
import org.jspecify.annotations.Nullable;
import spanwright.circuits.Circuit;
import spanwright.loss.Budget;
import spanwright.loss.BudgetCheck;
import spanwright.loss.PathLoss;
import spanwright.plant.Enclosure;
import spanwright.quantity.Length;
import spanwright.quantity.Wavelength;
import spanwright.trace.ElementKind;
import spanwright.trace.GlassTrack;
import spanwright.trace.Path;
import spanwright.trace.PathEnd;
import spanwright.trace.Station;
import spanwright.trace.TrackPoint;

/** The document of a trace. */
public final class TraceDocument {

    private static final double DISPERSION_STEP = 1e6;

    private final TraceAnswer answer;
    private final ElementDocument elements;
    private final boolean tracks;

    /**
     * Of an answer.
     *
     * @param tracks whether each path says where its glass lies on the map
     */
    public TraceDocument(TraceAnswer answer, boolean tracks) {
        this.answer = answer;
        this.elements = new ElementDocument(answer.view());
        this.tracks = tracks;
    }

    /** Writes its members. */
    public void write(Json json) {
        json.number(
                "wavelength_nm",
                answer.wavelength().map(Wavelength::exactNanometres).orElse(null));
        json.whole("posting", answer.view().posting());
        json.list("paths", answer.paths(), this::path);
    }

    private void path(Json json, TraceAnswer.Reckoned reckoned) {
        Path path = reckoned.path();
        @Nullable PathLoss loss = reckoned.loss();
        List<String> circuits = path.circuits().stream().map(Circuit::code).toList();
        json.flag("complete", path.complete()).text("circuit", circuits.isEmpty() ? null : circuits.get(0));
        json.texts("circuits", circuits)
                .number("wavelength_nm", reckoned.wavelength().exactNanometres());
        json.flag("loop", path.loop())
                .texts("ends", path.ends().stream().map(PathEnd::name).toList());
        json.list("elements", items -> elements(items, path, loss));
        json.object("totals", item -> totals(item, path, loss));
        if (reckoned.problem() != null) {
            json.text("problem", reckoned.problem());
        }
        budget(json, reckoned.budget());
        if (tracks) {
            GlassTrack track = GlassTrack.of(path);
            json.list("track", points -> track.points().forEach(point -> point(points, point)));
            json.list("stations", track.stations(), TraceDocument::station);
        }
    }

    private void elements(Json items, Path path, @Nullable PathLoss loss) {
        if (loss == null) {
            // Each would have to state a loss.
            return;
        }
        List<Length> before = path.glassBefore();
        for (int index = 0; index < before.size(); index++) {
            int place = index;
            items.objectHere(item -> elements.write(item, loss.elements().get(place), before.get(place)));
        }
    }

    private static void totals(Json json, Path path, @Nullable PathLoss loss) {
        json.metres("sheath_m", path.sheath()).metres("glass_m", path.glass()).metres("route_m", path.route());
        json.whole("splices", path.count(ElementKind.SPLICE)).whole("connectors", path.count(ElementKind.CONNECTOR));
        json.whole("splitters", path.count(ElementKind.SPLITTER));
        if (loss == null) {
            json.none("loss_db").none("loss_limit_db").none("loss_statistical_db");
            return;
        }
        json.decibels("loss_db", loss.expected()).decibels("loss_limit_db", loss.limit());
        json.decibels("loss_statistical_db", loss.statistical());
        json.number(
                "dispersion_ps_per_nm",
                loss.dispersion().psPerNm().map(TraceDocument::rounded).orElse(null));
        json.number(
                "pmd_ps", loss.dispersion().pmdPs().map(TraceDocument::rounded).orElse(null));
        json.whole("unmeasured", loss.unmeasured()).whole("unverified", loss.unverified());
    }

    private static Double rounded(Double value) {
        return Math.rint(value * DISPERSION_STEP) / DISPERSION_STEP;
    }

    private static void budget(Json json, @Nullable BudgetCheck check) {
        if (check == null) {
            json.none("budget");
            return;
        }
        Budget budget = check.budget();
        json.object("budget", item -> {
            item.text("class", budget.code()).decibels("max_db", budget.max()).decibels("min_db", budget.min());
            item.decibels("margin_db", check.margin())
                    .flag("passes", check.passes())
                    .decibels("left_db", check.left());
            item.flag("passes_at_limit", check.passesAtLimit()).flag("overload", check.overload());
            item.text("source", budget.source());
        });
    }

    private static void point(Json json, TrackPoint point) {
        json.listHere(item -> item.metresHere(point.glass())
                .metresHere(point.sheath())
                .metresHere(point.route())
                .degreesHere(point.position().lon())
                .degreesHere(point.position().lat()));
    }

    private static void station(Json json, Station station) {
        json.text("structure", station.structure().code())
                .text("kind", station.structure().type().word());
        json.text("enclosure", station.enclosure().map(Enclosure::code).orElse(null));
        json.metres("glass_m", station.at().glass())
                .metres("sheath_m", station.at().sheath());
        json.metres("route_m", station.at().route()).place(station.structure().position());
        json.metres("coil_m", station.coil());
    }
}
