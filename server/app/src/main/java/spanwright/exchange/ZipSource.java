package spanwright.exchange;

import java.io.FilterInputStream;
import java.io.IOException;
import java.io.InputStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeMap;
import java.util.zip.ZipEntry;
import java.util.zip.ZipException;
import java.util.zip.ZipFile;

/**
 * The files of a zip of a records folder: those at the top or, where none of a folder's files is there, those in
 * its one folder. Nothing is unpacked to disk. How much a file swells and how much comes out in all is bounded.
 */
final class ZipSource implements Source {

    /** The most bytes that come out in all. */
    static final long MOST_BYTES = 20L << 30;

    /** The most bytes that come out for a byte packed, once a file is past {@link #FREE_BYTES}. */
    static final long MOST_RATIO = 250;

    /** What a file may hold however well it is packed. */
    static final long FREE_BYTES = 16L << 20;

    private final ZipFile zip;
    private final Map<String, ZipEntry> files;
    private final long most;
    private long bytes;

    private ZipSource(ZipFile zip, Map<String, ZipEntry> files, long size) {
        this.zip = zip;
        this.files = files;
        // Entries may overlap and state any size: what comes out in all is held against the zip as it lies on disk.
        this.most = Math.min(MOST_BYTES, Math.max(size * MOST_RATIO, FREE_BYTES * Table.values().length));
    }

    /**
     * Opens a zip.
     *
     * @throws IOException where it is none, or names files that lie elsewhere; the message says what would be right
     */
    static ZipSource open(Path path) throws IOException {
        ZipDirectory.ask(path);
        ZipFile zip = new ZipFile(path.toFile());
        try {
            return new ZipSource(zip, files(zip), Files.size(path));
        } catch (IOException | RuntimeException e) {
            zip.close();
            throw e;
        }
    }

    private static Map<String, ZipEntry> files(ZipFile zip) throws IOException {
        Map<String, Map<String, ZipEntry>> byFolder = new TreeMap<>();
        Set<String> names = new HashSet<>();
        for (var entries = zip.entries(); entries.hasMoreElements(); ) {
            ZipEntry entry = entries.nextElement();
            String name = entry.getName();
            refuseElsewhere(name);
            if (!names.add(name)) {
                throw new ZipException("it holds '" + Texts.shown(name) + "' twice; each file stands once");
            }
            int slash = name.lastIndexOf('/');
            if (!entry.isDirectory()) {
                byFolder.computeIfAbsent(name.substring(0, slash + 1), folder -> new HashMap<>())
                        .put(name.substring(slash + 1), entry);
            }
        }
        return choose(byFolder);
    }

    private static void refuseElsewhere(String name) throws IOException {
        boolean absolute = name.startsWith("/") || name.startsWith("\\") || name.matches("(?s)[A-Za-z]:.*");
        List<String> steps = List.of(name.split("[/\\\\]", -1));
        if (absolute || steps.contains("..")) {
            throw new ZipException(
                    "it names '" + Texts.shown(name) + "', which lies outside of it; pack the files with plain names");
        }
        boolean doubled = steps.subList(0, steps.size() - 1).contains("");
        if (name.indexOf('\\') >= 0 || doubled || steps.contains(".")) {
            throw new ZipException("it names '" + Texts.shown(name)
                    + "'; part folders by one / and write no . or \\ in names, as ordinary zips do");
        }
    }

    private static Map<String, ZipEntry> choose(Map<String, Map<String, ZipEntry>> byFolder) throws IOException {
        Map<String, ZipEntry> top = byFolder.getOrDefault("", Map.of());
        if (holdsTables(top)) {
            return top;
        }
        List<Map.Entry<String, Map<String, ZipEntry>>> folders = byFolder.entrySet().stream()
                .filter(folder ->
                        folder.getKey().indexOf('/') == folder.getKey().length() - 1)
                .filter(folder -> !folder.getKey().startsWith("__MACOSX"))
                .filter(folder -> holdsTables(folder.getValue()))
                .toList();
        if (folders.size() > 1) {
            throw new ZipException("it holds several folders with tables, "
                    + folders.get(0).getKey() + " and " + folders.get(1).getKey() + "; pack one records folder");
        }
        return folders.isEmpty() ? top : folders.get(0).getValue();
    }

    private static boolean holdsTables(Map<String, ZipEntry> files) {
        return files.keySet().stream().anyMatch(name -> name.endsWith(".csv") || name.equals("basemap.geojson"));
    }

    @Override
    public List<String> names() {
        return files.keySet().stream().sorted().toList();
    }

    @Override
    public InputStream open(String name) throws IOException {
        ZipEntry entry = files.get(name);
        if (entry == null) {
            throw new ZipException("there is no " + name);
        }
        InputStream bytes = zip.getInputStream(entry);
        if (bytes == null) {
            throw new ZipException("there is no " + name);
        }
        long packed = Math.max(0, entry.getCompressedSize());
        InputStream bounded = new BoundedStream(
                new WholeEntry(bytes, entry),
                Math.max(FREE_BYTES, packed * MOST_RATIO),
                "the file swells to more than " + MOST_RATIO
                        + " times its packed size, as no records do; load the folder itself");
        return new Counted(bounded);
    }

    @Override
    public void close() throws IOException {
        zip.close();
    }

    /** Counts what comes out of all files together. */
    private final class Counted extends FilterInputStream {

        Counted(InputStream in) {
            super(in);
        }

        @Override
        public int read() throws IOException {
            int value = super.read();
            count(value < 0 ? 0 : 1);
            return value;
        }

        @Override
        public int read(byte[] into, int from, int length) throws IOException {
            int got = super.read(into, from, length);
            count(Math.max(got, 0));
            return got;
        }

        private void count(int more) throws IOException {
            bytes += more;
            if (bytes > most) {
                throw new ZipException("more than " + (most >> 20)
                        + " MiB come out of the zip, as of no records; load the folder itself");
            }
        }
    }
}
