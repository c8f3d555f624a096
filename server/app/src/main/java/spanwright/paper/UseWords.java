package spanwright.paper;

import java.util.Map;

/** What a fiber is used for, in the words of the tube chart. */
final class UseWords {

    private static final Map<String, String> WORDS = Map.of(
            "down", "DOWN",
            "single", "SINGLE",
            "in_use", "in use",
            "jumpered", "jumpered, no circuit known",
            "spare_unknown", "spare of unknown trust",
            "spare_verified", "verified spare");

    private UseWords() {}

    /** The words of a state of a fiber. */
    static String of(String state) {
        return WORDS.getOrDefault(state, state);
    }
}
