package spanwright.http;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import com.networknt.schema.JsonSchemaFactory;
import com.networknt.schema.SchemaLocation;
import com.networknt.schema.SchemaValidatorsConfig;
import com.networknt.schema.SpecVersion;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.net.http.HttpResponse;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Map;

/** Holds requests and answers to {@code schema/openapi.json}, out of the jar's own copy. */
final class OpenApi {

    private static final ObjectMapper MAPPER = new ObjectMapper();
    private static final String AT = "https://spanwright.invalid/openapi.json";

    private final JsonNode document;
    private final JsonSchemaFactory factory;
    private final SchemaValidatorsConfig config =
            SchemaValidatorsConfig.builder().formatAssertionsEnabled(true).build();

    OpenApi() {
        try (InputStream in = OpenApi.class.getResourceAsStream("/schema/openapi.json")) {
            String text = new String(in.readAllBytes(), StandardCharsets.UTF_8);
            document = MAPPER.readTree(text);
            factory = JsonSchemaFactory.getInstance(
                    SpecVersion.VersionFlag.V202012,
                    builder -> builder.schemaLoaders(loaders -> loaders.schemas(Map.of(AT, text))));
        } catch (IOException unreadable) {
            throw new UncheckedIOException(unreadable);
        }
    }

    /** Every operation as {@code GET /structures/{code}}. */
    List<String> operations() {
        List<String> operations = new ArrayList<>();
        for (Map.Entry<String, JsonNode> path : document.path("paths").properties()) {
            path.getValue()
                    .fieldNames()
                    .forEachRemaining(method -> operations.add(method.toUpperCase(Locale.ROOT) + " " + path.getKey()));
        }
        return operations;
    }

    /** Checks status, content type and body of an answer; gives the body. */
    JsonNode check(String method, String path, HttpResponse<byte[]> answer) {
        String name = method + " " + answer.uri() + " " + answer.statusCode();
        String pointer = "/paths/" + path.replace("~", "~0").replace("/", "~1") + "/" + method.toLowerCase(Locale.ROOT)
                + "/responses/";
        String response = document.at(pointer + answer.statusCode()).isMissingNode()
                ? pointer + "default"
                : pointer + answer.statusCode();
        JsonNode said = document.at(response);
        if (said.has("$ref")) {
            response = said.path("$ref").asText().substring(1);
            said = document.at(response);
        }
        assertThat(said.isMissingNode()).as(name + " is described").isFalse();
        if (!said.has("content")) {
            assertThat(answer.body()).as(name).isEmpty();
            return MAPPER.missingNode();
        }
        String type = answer.headers().firstValue("Content-Type").orElse("none");
        assertThat(said.path("content").has(type)).as("%s is %s", name, type).isTrue();
        if (!type.endsWith("json")) {
            assertThat(answer.body()).as(name).isNotEmpty();
            return MAPPER.missingNode();
        }
        JsonNode body = read(answer.body());
        assertValid(name, response + "/content/" + type.replace("/", "~1") + "/schema", body);
        return body;
    }

    /** Checks a request's body. */
    void checkRequest(String path, byte[] body) {
        String pointer = "/paths/" + path.replace("/", "~1") + "/post/requestBody/content/application~1json/schema";
        assertValid("POST " + path, pointer, read(body));
    }

    private void assertValid(String name, String pointer, JsonNode body) {
        assertThat(factory.getSchema(SchemaLocation.of(AT + "#" + pointer), config)
                        .validate(body))
                .as("%s: %s", name, body)
                .isEmpty();
    }

    static JsonNode read(byte[] body) {
        try {
            return MAPPER.readTree(body);
        } catch (IOException notJson) {
            throw new AssertionError("not JSON: " + new String(body, StandardCharsets.UTF_8), notJson);
        }
    }
}
