package spanwright.exchange;

import static java.nio.charset.StandardCharsets.UTF_8;

import java.io.ByteArrayOutputStream;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.Collections;
import java.util.List;
import java.util.Random;

/** Spoils one thing of a folder, drawn from a seed. Rows are parted at line ends and cells at commas, simply. */
final class Spoiling {

    private static final List<String> CELLS = List.of(
            "",
            " ",
            "0",
            "-1",
            "1e5",
            "NaN",
            "1-1",
            "12-1",
            "1-999999999",
            "999999999999999999999",
            "0.0000001",
            "\"",
            "\"\"",
            "x",
            "\u00e9",
            "\ud83d\ude00",
            "F-1",
            "E1",
            "E1/P/1",
            "E1/P/1-4",
            "F-1 ahead 1",
            "F-1 back 12-1",
            "S1 in",
            "S1 out 1-4",
            "2026-02-30",
            "2026-03-31",
            "planned",
            "verified",
            "unknown",
            "abandoned",
            "yes",
            "LINESTRING (0 0, 1 1)",
            "1,2",
            "100000",
            "1-100000",
            "12.5",
            "G.652.D",
            "splice.fusion",
            "=1+1");

    private final Random random;

    Spoiling(long seed) {
        this.random = new Random(seed * 0x9E3779B97F4A7C15L);
    }

    /** The folder with one thing spoilt. */
    FolderBytes spoil(FolderBytes folder) {
        String file = one(folder.names());
        byte[] bytes = folder.bytes(file);
        return switch (random.nextInt(9)) {
            case 0 -> byteChanged(folder, file, bytes.clone());
            case 1 -> byteTakenOut(folder, file, bytes);
            case 2 -> folder.with(file, Arrays.copyOf(bytes, random.nextInt(bytes.length)), "cut off");
            case 3, 4, 5 -> cellChanged(folder, file, bytes);
            case 6 -> rowMoved(folder, file, bytes);
            case 7 -> rowTwice(folder, file, bytes);
            default -> rowTakenOut(folder, file, bytes);
        };
    }

    private FolderBytes byteChanged(FolderBytes folder, String file, byte[] bytes) {
        int at = random.nextInt(bytes.length);
        bytes[at] = (byte) (random.nextBoolean() ? random.nextInt(256) : ' ' + random.nextInt(95));
        return folder.with(file, bytes, "byte " + at + " is " + bytes[at]);
    }

    private FolderBytes byteTakenOut(FolderBytes folder, String file, byte[] bytes) {
        int at = random.nextInt(bytes.length);
        ByteArrayOutputStream rest = new ByteArrayOutputStream();
        rest.write(bytes, 0, at);
        rest.write(bytes, at + 1, bytes.length - at - 1);
        return folder.with(file, rest.toByteArray(), "byte " + at + " taken out");
    }

    private FolderBytes cellChanged(FolderBytes folder, String file, byte[] bytes) {
        List<String> rows = rows(bytes);
        int row = random.nextInt(rows.size());
        String[] cells = rows.get(row).split(",", -1);
        int cell = random.nextInt(cells.length);
        String value = random.nextInt(3) == 0 ? one(List.of(one(rows).split(",", -1))) : one(CELLS);
        cells[cell] = value;
        rows.set(row, String.join(",", cells));
        return folder.with(file, bytes(rows), "cell " + cell + " of row " + (row + 1) + " is '" + value + "'");
    }

    private FolderBytes rowMoved(FolderBytes folder, String file, byte[] bytes) {
        List<String> rows = rows(bytes);
        int one = random.nextInt(rows.size());
        int other = random.nextInt(rows.size());
        Collections.swap(rows, one, other);
        return folder.with(file, bytes(rows), "rows " + (one + 1) + " and " + (other + 1) + " swapped");
    }

    private FolderBytes rowTwice(FolderBytes folder, String file, byte[] bytes) {
        List<String> rows = rows(bytes);
        int row = random.nextInt(rows.size());
        rows.add(random.nextInt(rows.size() + 1), rows.get(row));
        return folder.with(file, bytes(rows), "row " + (row + 1) + " twice");
    }

    private FolderBytes rowTakenOut(FolderBytes folder, String file, byte[] bytes) {
        List<String> rows = rows(bytes);
        int row = random.nextInt(rows.size());
        rows.remove(row);
        return folder.with(file, bytes(rows), "row " + (row + 1) + " taken out");
    }

    private <T> T one(List<T> all) {
        return all.get(random.nextInt(all.size()));
    }

    private static List<String> rows(byte[] bytes) {
        return new ArrayList<>(new String(bytes, UTF_8).lines().toList());
    }

    private static byte[] bytes(List<String> rows) {
        return (String.join("\n", rows) + "\n").getBytes(UTF_8);
    }
}
