package spanwright.exchange;

import com.fasterxml.jackson.core.JsonParser;
import com.fasterxml.jackson.core.JsonToken;
import com.fasterxml.jackson.core.util.JsonParserDelegate;
import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import org.jspecify.annotations.Nullable;

/** Reads the members of a collection one after another, each held whole and therefore bounded. */
final class FeatureParser extends JsonParserDelegate {

    private final int most;
    private int tokens;

    /**
     * Over a parser.
     *
     * @param most the most names, values and brackets of one member
     */
    FeatureParser(JsonParser parser, int most) {
        super(parser);
        this.most = most;
        setCodec(new ObjectMapper());
    }

    /** The member that the parser stands at, held whole. */
    @Nullable
    JsonNode feature() throws IOException {
        tokens = 0;
        return getCodec().readTree(this);
    }

    @Override
    public @Nullable JsonToken nextToken() throws IOException {
        if (++tokens > most) {
            throw new IOException("a feature of more than half a million positions; draw less in one");
        }
        return super.nextToken();
    }
}
