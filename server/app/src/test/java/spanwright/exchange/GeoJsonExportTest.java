package spanwright.exchange;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import java.nio.file.FileAlreadyExistsException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.locationtech.jts.geom.Envelope;
import org.locationtech.jts.geom.Geometry;
import spanwright.network.Snapshot;
import spanwright.network.SnapshotEditor;
import spanwright.records.Records;

/** RFC 7946: sections 3.1.1 (lon, lat), 3.3 (no null coordinates), 4 (no crs), 5 (bbox), 6.1 (foreign members). */
class GeoJsonExportTest {

    private static final Path DEMO = Path.of(System.getProperty("repository.root"), "demo-data");

    @TempDir
    Path temp;

    private Path out;

    @BeforeEach
    void name() {
        out = temp.resolve("map.geojson");
    }

    private static Records loaded(String folder) {
        SnapshotEditor editor = Snapshot.empty().edit();
        assertThat(FolderLoad.load(DEMO.resolve(folder), editor, FolderLoad.Progress.NONE))
                .isEmpty();
        return editor.build(3).records();
    }

    private static Records loaded(Map<String, String> files) {
        Map<String, byte[]> bytes = new HashMap<>();
        files.forEach((name, text) -> bytes.put(name, text.getBytes(java.nio.charset.StandardCharsets.UTF_8)));
        SnapshotEditor editor = Snapshot.empty().edit();
        assertThat(FolderLoad.load(new FolderBytes(bytes, "nothing"), editor)).isEmpty();
        return editor.build(1).records();
    }

    private JsonNode written(Records records) throws IOException {
        GeoJsonExport.write(records, "2026-12-01T04:00:00-08:00", out);
        return new ObjectMapper().readTree(out.toFile());
    }

    private static JsonNode feature(JsonNode map, String id) {
        for (JsonNode feature : map.path("features")) {
            if (feature.path("id").asText().equals(id)) {
                return feature;
            }
        }
        throw new AssertionError("no " + id);
    }

    @Test
    void says_of_what_posting_it_is_and_what_it_is_not() throws IOException {
        JsonNode map = written(loaded("cases/good/worked"));
        assertThat(map.path("type").asText()).isEqualTo("FeatureCollection");
        assertThat(map.has("crs")).isFalse();
        assertThat(map.path("posting").asInt()).isEqualTo(3);
        assertThat(map.path("posted_at").asText()).isEqualTo("2026-12-01T04:00:00-08:00");
        assertThat(map.path("note").asText())
                .contains("not a locate", "before you dig", "live until proven dark", "licensed practice");
        assertThat(map.path("features")).allSatisfy(feature -> {
            assertThat(feature.path("type").asText()).isEqualTo("Feature");
            assertThat(feature.at("/properties/caution").asText()).contains("not a locate");
        });
    }

    @Test
    void every_line_of_the_demo_is_sound_and_within_the_bounds() throws Exception {
        Records records = loaded("sallowmere");
        JsonNode map = written(records);
        Envelope bounds = new Envelope();
        for (JsonNode feature : map.path("features")) {
            Geometry geometry = GeoJsonGeometry.read(feature.path("geometry"));
            assertThat(geometry.isValid()).as(feature.path("id").asText()).isTrue();
            bounds.expandToInclude(geometry.getEnvelopeInternal());
        }
        JsonNode box = map.path("bbox");
        assertThat(List.of(
                        box.get(0).asDouble(),
                        box.get(1).asDouble(),
                        box.get(2).asDouble(),
                        box.get(3).asDouble()))
                .containsExactly(bounds.getMinX(), bounds.getMinY(), bounds.getMaxX(), bounds.getMaxY());
        assertThat(bounds.getMinX()).isBetween(-124.0, -122.0);
        assertThat(bounds.getMinY()).isBetween(-49.0, -47.0);
        assertThat(map.path("features").size())
                .isEqualTo(records.structures().count()
                        + records.spans().count()
                        + records.cables().count()
                        + records.enclosures().count());
    }

    /** The sheath of the worked example in the records folder's description of sheath positions: 0 to 2130 m. */
    @Test
    void lengths_are_metres() throws IOException {
        JsonNode map = written(loaded(Map.of(
                "structures.csv", "structure,kind,lon,lat\nA,pole,0,0\nB,pole,0.009,0\nC,pole,0.018,0\n",
                "spans.csv", "span,from,to,placement,length_m\nS-1,A,B,aerial,1000\nS-2,B,C,aerial,1000\n",
                "cable_types.csv", "cable_type,fibers,fibers_per_tube,fiber_type\nF12,12,12,G.652.D\n",
                "cables.csv", "cable,cable_type\nF-1,F12\n",
                "cable_runs.csv", "cable,seq,structure,slack_m\nF-1,0,A,20\nF-1,1,B,30\nF-1,2,C,10\n",
                "sheath_marks.csv", "cable,seq,unit,mark_in,mark_out\nF-1,0,m,,5000\nF-1,1,m,,6060\nF-1,2,m,7100,\n")));
        assertThat(feature(map, "spans/S-1").at("/properties/route_m").asDouble())
                .isEqualTo(1000);
        assertThat(feature(map, "cables/F-1").at("/properties/sheath_m").asDouble())
                .isCloseTo(2130, within(0.001));
        assertThat(feature(map, "structures/B").at("/geometry/coordinates").toString())
                .isEqualTo("[0.009,0]");
    }

    @Test
    void a_cable_s_line_does_not_turn_back_where_a_span_is_drawn_the_other_way_round() throws IOException {
        JsonNode map = written(loaded(Map.of(
                "structures.csv", "structure,kind,lon,lat\nA,pole,0,0\nB,pole,0.01,0\nC,pole,0.02,0\n",
                "spans.csv", """
                        span,from,to,placement,line
                        S-1,A,B,aerial,"LINESTRING (0.01 0, 0.005 0.001, 0 0)"
                        S-2,C,B,aerial,"LINESTRING (0.01 0, 0.015 0.001, 0.02 0)"
                        """,
                "cable_types.csv", "cable_type,fibers,fibers_per_tube,fiber_type\nF12,12,12,G.652.D\n",
                "cables.csv", "cable,cable_type\nF-1,F12\n",
                "cable_runs.csv", "cable,seq,structure\nF-1,0,A\nF-1,1,B\nF-1,2,C\n")));
        assertThat(feature(map, "cables/F-1").at("/geometry/coordinates").toString())
                .isEqualTo("[[0,0],[0.005,0.001],[0.01,0],[0.015,0.001],[0.02,0]]");
    }

    @Test
    void empty_records_are_a_collection_without_features_and_without_bounds() throws IOException {
        GeoJsonExport.write(Records.empty(), null, out);
        JsonNode map = new ObjectMapper().readTree(out.toFile());
        assertThat(map.path("features").isEmpty()).isTrue();
        assertThat(map.has("bbox")).isFalse();
        assertThat(map.path("posted_at").isNull()).isTrue();
    }

    @Test
    void what_is_there_already_is_left_as_it_is() throws IOException {
        Files.writeString(out, "mine");
        org.assertj.core.api.Assertions.assertThatThrownBy(() -> GeoJsonExport.write(Records.empty(), null, out))
                .isInstanceOf(FileAlreadyExistsException.class);
        assertThat(out).hasContent("mine");
        assertThat(temp.toFile().list()).containsExactly("map.geojson");
    }
}
