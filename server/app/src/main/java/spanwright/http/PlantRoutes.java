package spanwright.http;

import static spanwright.http.Answering.AS_IF;
import static spanwright.http.Answering.AS_OF;

import io.javalin.http.Context;
import java.util.function.BiConsumer;
import org.jspecify.annotations.Nullable;
import spanwright.answers.CableDocument;
import spanwright.answers.CircuitDocuments;
import spanwright.answers.EnclosureDocument;
import spanwright.answers.FindDocument;
import spanwright.answers.Json;
import spanwright.answers.MapDocuments;
import spanwright.answers.PlaceDocuments;
import spanwright.answers.References;
import spanwright.answers.StatusDocument;
import spanwright.answers.View;
import spanwright.atlas.Box;
import spanwright.atlas.NameAtlas;
import spanwright.atlas.PlantAtlas;
import spanwright.circuits.Circuit;
import spanwright.plant.Cable;
import spanwright.plant.Enclosure;
import spanwright.plant.Span;
import spanwright.plant.Structure;

/** What is there: the status, the map, and each thing by its code. */
final class PlantRoutes {

    private static final int LONGEST_QUERY = 200;
    private static final int LONGEST_CODE = 200;
    private static final int MOST_FOUND = 50;
    private static final int MOST_CIRCUITS = 1_000;
    private static final int NEAREST_ZOOM = 24;

    private final Answering answering;
    private final StatusDocument status;
    private final NameAtlas names = new NameAtlas();
    private final PlantAtlas places = new PlantAtlas();

    PlantRoutes(Api api, Answering answering, ServerOptions.@Nullable Tile tile) {
        this.answering = answering;
        StatusDocument.Tile named = tile == null ? null : new StatusDocument.Tile(tile.url(), tile.attribution());
        this.status = new StatusDocument(api.views(), api.version(), api.demo(), named);
    }

    void status(Context ctx) {
        View view = answering.view(new Question(ctx, AS_OF, AS_IF));
        answering.answer(ctx, view, (json, of) -> status.write(json, of, answering.changes(of)));
    }

    void find(Context ctx) {
        Question question = new Question(ctx, "q", "limit", AS_OF, AS_IF);
        String typed = question.needed("q", LONGEST_QUERY);
        int limit = question.whole("limit", 1, MOST_FOUND, 12);
        answering.answer(
                ctx, answering.view(question), (json, view) -> new FindDocument(view, names).write(json, typed, limit));
    }

    void mapPlant(Context ctx) {
        Question question = new Question(ctx, "west", "south", "east", "north", "zoom", AS_OF, AS_IF);
        Box box = box(question);
        double zoom = question.neededNumber("zoom", 0, NEAREST_ZOOM);
        answering.answer(
                ctx, answering.view(question), (json, view) -> new MapDocuments(view).plant(json, places, box, zoom));
    }

    void mapBase(Context ctx) {
        Question question = new Question(ctx, "west", "south", "east", "north", "zoom");
        Box box = box(question);
        double zoom = question.neededNumber("zoom", 0, NEAREST_ZOOM);
        answering.answer(ctx, answering.views().now(), (json, view) -> new MapDocuments(view).base(json, box, zoom));
    }

    /** A map may be dragged past the edges of the world, so its box may lie beyond them. */
    private static Box box(Question question) {
        double west = question.neededNumber("west", -1_080, 1_080);
        double south = question.neededNumber("south", -180, 180);
        double east = question.neededNumber("east", -1_080, 1_080);
        double north = question.neededNumber("north", -180, 180);
        if (west > east) {
            throw Question.wrong("east", "east is not west of west.");
        }
        if (south > north) {
            throw Question.wrong("north", "north is not south of south.");
        }
        return new Box(west, south, east, north);
    }

    void structure(Context ctx) {
        thing(ctx, (json, view) -> {
            Structure structure = new References(view.records()).structure(ctx.pathParam("code"));
            new PlaceDocuments(view, answering.changes(view)).structure(json, structure);
        });
    }

    void span(Context ctx) {
        thing(ctx, (json, view) -> {
            Span span = new References(view.records()).span(ctx.pathParam("code"));
            new PlaceDocuments(view, answering.changes(view)).span(json, span);
        });
    }

    void enclosure(Context ctx) {
        thing(ctx, (json, view) -> {
            Enclosure enclosure = new References(view.records()).enclosure(ctx.pathParam("code"));
            new EnclosureDocument(view, answering.changes(view), enclosure).write(json);
        });
    }

    void cable(Context ctx) {
        thing(ctx, (json, view) -> {
            Cable cable = new References(view.records()).cable(ctx.pathParam("code"));
            new CableDocument(view, answering.changes(view), cable).write(json);
        });
    }

    void circuit(Context ctx) {
        thing(ctx, (json, view) -> {
            Circuit circuit = new References(view.records()).circuit(ctx.pathParam("code"));
            new CircuitDocuments(view).one(json, circuit, answering.changes(view));
        });
    }

    private void thing(Context ctx, BiConsumer<Json, View> body) {
        answering.answer(ctx, answering.view(new Question(ctx, AS_OF, AS_IF)), body);
    }

    void circuits(Context ctx) {
        Question question = new Question(ctx, "prefix", "limit", "after", AS_OF, AS_IF);
        String prefix = question.text("prefix");
        String after = question.text("after");
        if (prefix != null && prefix.length() > LONGEST_CODE) {
            throw Question.wrong("prefix", "prefix is " + LONGEST_CODE + " characters long at most.");
        }
        int limit = question.whole("limit", 1, MOST_CIRCUITS, 100);
        answering.answer(
                ctx,
                answering.view(question),
                (json, view) -> new CircuitDocuments(view).page(json, prefix == null ? "" : prefix, after, limit));
    }
}
