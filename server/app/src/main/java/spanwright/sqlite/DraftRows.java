package spanwright.sqlite;

import java.sql.Connection;
import java.sql.PreparedStatement;
import java.sql.ResultSet;
import java.sql.SQLException;
import java.time.LocalDate;
import java.util.ArrayList;
import java.util.List;
import org.jspecify.annotations.Nullable;
import spanwright.draft.Answer;
import spanwright.draft.Draft;
import spanwright.draft.DraftState;
import spanwright.draft.DraftText;
import spanwright.sheet.SheetHeader;

/** Drafts as rows of their tables. */
final class DraftRows {

    private DraftRows() {}

    static Draft draft(ResultSet row) throws SQLException {
        int posting = row.getInt("posting");
        Integer posted = row.wasNull() ? null : (Integer) posting;
        return new Draft(
                row.getInt("id"),
                row.getInt("enclosure"),
                row.getString("author"),
                PostingTime.parse(row.getString("begun_at")),
                PostingTime.parse(row.getString("saved_at")),
                row.getInt("revision"),
                row.getInt("base"),
                new Draft.Steps(row.getInt("oldest"), row.getInt("at"), row.getInt("newest")),
                DraftState.find(row.getString("state")).orElseThrow(),
                row.getString("submitted_by"),
                posted,
                row.getString("fingerprint"),
                text(row));
    }

    static DraftText text(ResultSet row) throws SQLException {
        String splicedOn = row.getString("spliced_on");
        return new DraftText(
                split(row.getString("lines")),
                new SheetHeader(
                        row.getString("job"),
                        row.getString("spliced_by"),
                        splicedOn == null ? null : LocalDate.parse(splicedOn),
                        row.getString("source"),
                        row.getString("note")),
                row.getInt("cursor_line"),
                row.getInt("cursor_column"),
                answers(row.getString("answers")));
    }

    private static List<String> split(String lines) {
        return lines.isEmpty()
                ? List.of()
                : List.of(lines.substring(0, lines.length() - 1).split("\n", -1));
    }

    private static String join(List<String> lines) {
        return lines.isEmpty() ? "" : String.join("\n", lines) + "\n";
    }

    private static List<Answer> answers(String text) {
        List<String> parts = split(text);
        List<Answer> answers = new ArrayList<>();
        for (int index = 0; index + 2 < parts.size(); index += 3) {
            answers.add(new Answer(parts.get(index), parts.get(index + 1), parts.get(index + 2)));
        }
        return answers;
    }

    private static String answers(DraftText text) {
        List<String> parts = new ArrayList<>();
        text.answers().forEach(answer -> parts.addAll(List.of(answer.rule(), answer.line(), answer.reason())));
        return join(parts);
    }

    static void insert(Connection connection, Draft draft) throws SQLException {
        try (PreparedStatement row =
                connection.prepareStatement("INSERT INTO draft VALUES (?, ?, ?, ?, ?, ?, ?, ?, ?, ?, ?, ?, ?, ?)")) {
            row.setInt(1, draft.id());
            row.setInt(2, draft.enclosure());
            row.setString(3, draft.author());
            row.setString(4, PostingTime.text(draft.begunAt()));
            bind(row, 5, draft);
            row.executeUpdate();
        }
    }

    static void update(Connection connection, Draft draft) throws SQLException {
        try (PreparedStatement row =
                connection.prepareStatement("UPDATE draft SET saved_at = ?, revision = ?, base = ?,"
                        + " oldest = ?, at = ?, newest = ?, state = ?, submitted_by = ?, posting = ?, fingerprint = ?"
                        + " WHERE id = ?")) {
            bind(row, 1, draft);
            row.setInt(11, draft.id());
            row.executeUpdate();
        }
    }

    /** Binds what changes in a draft. */
    private static void bind(PreparedStatement row, int from, Draft draft) throws SQLException {
        row.setString(from, PostingTime.text(draft.savedAt()));
        row.setInt(from + 1, draft.revision());
        row.setInt(from + 2, draft.base());
        row.setInt(from + 3, draft.steps().oldest());
        row.setInt(from + 4, draft.steps().at());
        row.setInt(from + 5, draft.steps().newest());
        row.setString(from + 6, draft.state().word());
        row.setString(from + 7, draft.submittedBy());
        row.setObject(from + 8, draft.posting());
        row.setString(from + 9, draft.fingerprint());
    }

    static void deleteVersion(Connection connection, Draft draft) throws SQLException {
        try (PreparedStatement row =
                connection.prepareStatement("DELETE FROM draft_version WHERE draft = ? AND number = ?")) {
            row.setInt(1, draft.id());
            row.setInt(2, draft.steps().at());
            row.executeUpdate();
        }
    }

    static void insertVersion(Connection connection, Draft draft) throws SQLException {
        DraftText text = draft.text();
        SheetHeader header = text.header();
        try (PreparedStatement row =
                connection.prepareStatement("INSERT INTO draft_version VALUES (?, ?, ?, ?, ?, ?, ?, ?, ?, ?, ?)")) {
            row.setInt(1, draft.id());
            row.setInt(2, draft.steps().at());
            row.setString(3, join(text.lines()));
            row.setString(4, header.job());
            row.setString(5, header.splicedBy());
            row.setString(6, written(header.splicedOn()));
            row.setString(7, header.source());
            row.setString(8, header.note());
            row.setInt(9, text.cursorLine());
            row.setInt(10, text.cursorColumn());
            row.setString(11, answers(text));
            row.executeUpdate();
        }
    }

    private static @Nullable String written(@Nullable LocalDate date) {
        return date == null ? null : date.toString();
    }
}
