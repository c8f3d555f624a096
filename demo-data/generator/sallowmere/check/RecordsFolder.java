package sallowmere.check;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/** A records folder as it lies on the disk: it knows nothing of how the rows were made. */
public final class RecordsFolder {
    private final Path folder;
    private final Map<String, List<Map<String, String>>> read = new HashMap<>();

    /** Opens a folder. */
    public RecordsFolder(Path folder) {
        this.folder = folder;
    }

    /** The rows of a file, each by column; none where there is no such file. */
    public List<Map<String, String>> rows(String file) {
        return read.computeIfAbsent(file, this::parse);
    }

    /** The rows of a file by the value of a column. */
    public Map<String, List<Map<String, String>>> rowsBy(String file, String column) {
        Map<String, List<Map<String, String>>> by = new LinkedHashMap<>();
        rows(file)
                .forEach(row -> by.computeIfAbsent(row.get(column), key -> new ArrayList<>())
                        .add(row));
        return by;
    }

    /** Bytes of all files together. */
    public long size() {
        try (var files = Files.list(folder)) {
            return files.mapToLong(file -> file.toFile().length()).sum();
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    /** Bytes of one file. */
    public long size(String file) {
        return folder.resolve(file).toFile().length();
    }

    private List<Map<String, String>> parse(String file) {
        Path path = folder.resolve(file);
        if (!Files.exists(path)) {
            return List.of();
        }
        try {
            List<List<String>> lines = cells(Files.readString(path));
            List<Map<String, String>> rows = new ArrayList<>();
            for (List<String> line : lines.subList(1, lines.size())) {
                if (line.size() != lines.get(0).size()) {
                    throw new IllegalStateException(file + ": a row of " + line.size() + " values: " + line);
                }
                Map<String, String> row = new HashMap<>();
                for (int i = 0; i < line.size(); i++) {
                    row.put(lines.get(0).get(i), line.get(i));
                }
                rows.add(row);
            }
            return rows;
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    private static List<List<String>> cells(String text) {
        List<List<String>> lines = new ArrayList<>();
        List<String> line = new ArrayList<>();
        StringBuilder cell = new StringBuilder();
        boolean quoted = false;
        for (int i = 0; i < text.length(); i++) {
            char c = text.charAt(i);
            if (quoted && c == '"' && i + 1 < text.length() && text.charAt(i + 1) == '"') {
                cell.append('"');
                i++;
            } else if (c == '"') {
                quoted = !quoted;
            } else if (!quoted && (c == ',' || c == '\n')) {
                line.add(cell.toString());
                cell.setLength(0);
                if (c == '\n') {
                    lines.add(line);
                    line = new ArrayList<>();
                }
            } else {
                cell.append(c);
            }
        }
        return lines;
    }
}
