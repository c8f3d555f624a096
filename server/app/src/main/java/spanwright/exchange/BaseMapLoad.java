package spanwright.exchange;

import com.fasterxml.jackson.core.JsonFactory;
import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.core.JsonToken;
import com.fasterxml.jackson.databind.JsonNode;
import java.io.IOException;
import java.io.InputStream;
import java.util.List;
import org.jspecify.annotations.Nullable;
import org.locationtech.jts.geom.Geometry;
import spanwright.journal.Change;
import spanwright.journal.RecordKind;
import spanwright.plant.BaseFeature;

/**
 * Enters {@code basemap.geojson}: features of RFC 7946 with a {@code layer} and perhaps a {@code name}. A feature
 * is read whole and then let go, so memory is bounded by the largest, and what comes in all by {@link #MOST_BYTES}.
 */
final class BaseMapLoad {

    /** The file's name. */
    static final String FILE = "basemap.geojson";

    /** The layers, in the order in which they are drawn. */
    static final List<String> LAYERS = List.of("water", "wood", "street", "building", "place");

    private static final long MOST_BYTES = 512L << 20;
    /** The most names, values and brackets of one feature: half a million positions. */
    private static final int MOST_TOKENS = 2_000_000;

    private static final String FORM = "; it is {\"type\": \"FeatureCollection\", \"features\": [...]} of RFC 7946";

    private final Entering entering;
    private final FolderLoad.Progress progress;
    private long features;
    private int begun = 1;

    BaseMapLoad(Entering entering, FolderLoad.Progress progress) {
        this.entering = entering;
        this.progress = progress;
    }

    /** Reads the file; every fault that can be found is told. */
    void read(InputStream bytes) {
        InputStream bounded = new BoundedStream(
                bytes, MOST_BYTES, "the base map is larger than " + (MOST_BYTES >> 20) + " MiB; draw less on it");
        try (FeatureParser parser = new FeatureParser(new JsonFactory().createParser(bounded), MOST_TOKENS)) {
            readCollection(parser);
        } catch (JsonProcessingException e) {
            int line = e.getLocation() == null
                    ? begun
                    : Math.max(begun, e.getLocation().getLineNr());
            fault(line, "is no JSON: " + Texts.shown(e.getOriginalMessage()) + FORM);
        } catch (IOException e) {
            fault(begun, "cannot be read on from here: " + e.getMessage());
        }
        progress.read("basemap", features, true);
    }

    private void readCollection(FeatureParser parser) throws IOException {
        boolean typed = false;
        boolean listed = false;
        if (parser.nextToken() != JsonToken.START_OBJECT) {
            fault(1, "is no FeatureCollection" + FORM);
            return;
        }
        while (parser.nextToken() == JsonToken.FIELD_NAME) {
            String name = parser.currentName();
            parser.nextToken();
            if (name.equals("type")) {
                typed = "FeatureCollection".equals(parser.getValueAsString());
                parser.skipChildren();
            } else if (name.equals("features") && parser.currentToken() == JsonToken.START_ARRAY) {
                listed = true;
                readFeatures(parser);
            } else {
                parser.skipChildren();
            }
        }
        if (!typed || !listed) {
            fault(1, "is no FeatureCollection" + FORM);
        }
        if (parser.nextToken() != null) {
            fault(parser.currentTokenLocation().getLineNr(), "goes on after its end" + FORM);
        }
    }

    private void readFeatures(FeatureParser parser) throws IOException {
        while (parser.nextToken() != JsonToken.END_ARRAY) {
            begun = parser.currentTokenLocation().getLineNr();
            enter(begun, parser.feature());
            features++;
        }
    }

    private void enter(int line, @Nullable JsonNode feature) {
        if (feature == null || !feature.path("type").asText().equals("Feature")) {
            fault(line, "is no Feature; each member of features is {\"type\": \"Feature\", ...}");
            return;
        }
        JsonNode layer = feature.path("properties").path("layer");
        boolean known = layer.isTextual() && LAYERS.contains(layer.asText());
        if (!known) {
            fault(
                    line,
                    (layer.isTextual()
                                    ? "layer '" + Texts.shown(layer.asText()) + "' is not one of "
                                    : "the feature has no layer; its properties name one of ")
                            + String.join(", ", LAYERS));
        }
        String name = name(feature.path("properties").path("name"), line);
        try {
            Geometry geometry = GeoJsonGeometry.read(feature.path("geometry"));
            if (known) {
                int id = entering.view().limit(RecordKind.BASE_FEATURE);
                entering.apply(Change.add(new BaseFeature(id, layer.asText(), name, geometry)), line);
            }
        } catch (GeoJsonGeometry.WrongGeometry e) {
            fault(line, e.sentence());
        }
    }

    private @Nullable String name(JsonNode name, int line) {
        String text = name.isValueNode() && !name.isNull() ? name.asText() : "";
        if (!Texts.canBeWritten(text)) {
            fault(
                    line,
                    "the name '" + Texts.shown(text) + "' holds control characters or halves of characters;"
                            + " take them out");
        }
        return text.isEmpty() ? null : text;
    }

    private void fault(int line, String text) {
        entering.faults().add(FILE, line, text);
    }
}
