package spanwright.http;

import java.util.List;
import java.util.function.Consumer;
import org.jspecify.annotations.Nullable;
import spanwright.answers.Json;
import spanwright.answers.Unanswerable;

/**
 * A problem document as of RFC 9457.
 *
 * @param status HTTP status
 * @param title the kind of problem in a few words
 * @param code its stable name, see {@code schema/openapi.json}
 * @param detail what is wrong and what would be right
 * @param parameter the query parameter that is wrong, or null
 * @param faults for a refused posting every fault, else empty
 * @param more writes what else it holds, or null
 */
record Problem(
        int status,
        String title,
        String code,
        String detail,
        @Nullable String parameter,
        List<Fault> faults,
        @Nullable Consumer<Json> more) {

    /** What a problem document is sent as. */
    static final String CONTENT_TYPE = "application/problem+json";

    Problem {
        faults = List.copyOf(faults);
    }

    Problem(int status, String title, String code, String detail, @Nullable String parameter, List<Fault> faults) {
        this(status, title, code, detail, parameter, faults, null);
    }

    /** The same with more members. */
    Problem with(Consumer<Json> members) {
        return new Problem(status, title, code, detail, parameter, faults, members);
    }

    static Problem conflict(String code, String detail) {
        return new Problem(409, "Conflict", code, detail, null, List.of());
    }

    static Problem notFound(String detail) {
        return new Problem(404, "Not found", "not_found", detail, null, List.of());
    }

    static Problem badRequest(String detail, @Nullable String parameter) {
        return new Problem(400, "Bad request", "bad_request", detail, parameter, List.of());
    }

    static Problem forbidden(String detail) {
        return new Problem(403, "Forbidden", "forbidden", detail, null, List.of());
    }

    static Problem methodNotAllowed(String detail) {
        return new Problem(405, "Method not allowed", "method_not_allowed", detail, null, List.of());
    }

    static Problem tooLarge(String detail) {
        return new Problem(413, "Too large", "too_large", detail, null, List.of());
    }

    static Problem unsupported(String detail) {
        return new Problem(415, "Unsupported media type", "unsupported_media_type", detail, null, List.of());
    }

    static Problem refused(List<Fault> faults) {
        String count = faults.size() == 1 ? "1 fault" : faults.size() + " faults";
        return new Problem(422, "Refused", "refused", count + "; nothing was posted.", null, faults);
    }

    static Problem unavailable(String detail) {
        return new Problem(503, "Unavailable", "unavailable", detail, null, List.of());
    }

    static Problem internal() {
        return new Problem(
                500,
                "Internal error",
                "internal",
                "The program failed on this question; its log says where. The records are as they were.",
                null,
                List.of());
    }

    static Problem of(Unanswerable question) {
        return switch (question.kind()) {
            case BAD_REQUEST -> badRequest(question.sentence(), question.parameter());
            case BAD_REFERENCE -> of(question, 404, "Not found", "bad_reference");
            case NOT_FOUND -> notFound(question.sentence());
            case WAVELENGTH_OUT_OF_RANGE -> of(question, 400, "Bad request", "wavelength_out_of_range");
            case TOO_SLOW -> unavailable(question.sentence());
        };
    }

    private static Problem of(Unanswerable question, int status, String title, String code) {
        return new Problem(status, title, code, question.sentence(), question.parameter(), List.of());
    }

    /** The document's bytes. */
    byte[] bytes(String instance) {
        return Json.bytes(json -> {
            json.text("type", "about:blank").text("title", title).whole("status", status);
            json.text("detail", detail).text("code", code).text("instance", instance);
            if (parameter != null) {
                json.text("parameter", parameter);
            }
            if (!faults.isEmpty()) {
                json.list(
                        "faults",
                        faults,
                        (item, fault) -> item.whole("change", fault.change)
                                .text("column", fault.column)
                                .text("text", fault.text));
            }
            if (more != null) {
                more.accept(json);
            }
        });
    }

    /**
     * One fault of a refused posting.
     *
     * @param change index of the change in the request, from 0
     * @param column the column that is wrong, or null where it is the row as a whole
     * @param text what is wrong and what would be right
     */
    record Fault(int change, @Nullable String column, String text) {}
}
