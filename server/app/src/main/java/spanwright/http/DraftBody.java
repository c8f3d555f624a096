package spanwright.http;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.ArrayList;
import java.util.List;
import java.util.Objects;
import org.jspecify.annotations.Nullable;
import spanwright.draft.Answer;
import spanwright.draft.DraftText;
import spanwright.sheet.SheetHeader;

/** What is written in a draft, read strictly; letters are kept as they were typed. */
final class DraftBody {

    private static final int MOST_LINES = 5_000;
    private static final int LONGEST_LINE = 2_000;
    private static final int MOST_ANSWERS = 5_000;

    private DraftBody() {}

    /** The members of which a text is made. */
    static final String[] MEMBERS = {"lines", "header", "cursor", "answers"};

    static DraftText read(Sent sent) {
        JsonNode cursor = sent.member("cursor");
        Sent at = cursor.isMissingNode() ? null : Sent.within(cursor, "cursor", "line", "column");
        return new DraftText(
                lines(sent.member("lines")),
                header(sent.member("header")),
                place(at, "line", MOST_LINES),
                place(at, "column", LONGEST_LINE + 1),
                answers(sent));
    }

    private static int place(@Nullable Sent at, String name, int most) {
        return at == null ? 1 : Objects.requireNonNullElse(at.findWhole(name, 1, most), 1);
    }

    private static List<String> lines(JsonNode node) {
        List<String> lines = new ArrayList<>();
        if (node.isMissingNode()) {
            return lines;
        }
        if (!node.isArray() || node.size() > MOST_LINES) {
            throw Sent.bad("lines is a list of " + MOST_LINES + " lines at most.");
        }
        for (JsonNode line : node) {
            lines.add(typed(line, "lines[" + lines.size() + "]"));
        }
        return lines;
    }

    private static String typed(JsonNode node, String at) {
        String text = node.isTextual() ? node.asText() : "\n";
        boolean writable = text.chars().allMatch(letter -> letter == '\t' || !Character.isISOControl(letter));
        if (text.length() > LONGEST_LINE || !writable) {
            throw Sent.bad(at + " is a text of " + LONGEST_LINE + " characters at most, without a line break.");
        }
        return text;
    }

    private static SheetHeader header(JsonNode node) {
        if (node.isMissingNode() || node.isNull()) {
            return SheetHeader.NONE;
        }
        Sent header = Sent.within(node, "header", "job", "spliced_by", "spliced_on", "source", "note");
        return new SheetHeader(
                header.findText("job", PostingBody.LONGEST_NAME),
                header.findText("spliced_by", PostingBody.LONGEST_NAME),
                header.findDate("spliced_on"),
                header.findText("source", PostingBody.LONGEST_NAME),
                header.findText("note", LONGEST_LINE));
    }

    private static List<Answer> answers(Sent sent) {
        List<Answer> answers = new ArrayList<>();
        for (Sent each : sent.objects("answers", MOST_ANSWERS, "rule", "line", "reason")) {
            String at = "answers[" + answers.size() + "].";
            JsonNode line = each.member("line");
            answers.add(new Answer(
                    typed(each.member("rule"), at + "rule"),
                    line.isMissingNode() ? "" : typed(line, at + "line"),
                    reason(typed(each.member("reason"), at + "reason"), at)));
        }
        return answers;
    }

    private static String reason(String text, String at) {
        if (text.isBlank()) {
            throw Sent.bad(at + "reason is a text that is not blank.");
        }
        return text;
    }
}
