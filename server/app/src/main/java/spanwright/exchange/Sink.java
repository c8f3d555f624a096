package spanwright.exchange;

import java.io.BufferedOutputStream;
import java.io.Closeable;
import java.io.FilterOutputStream;
import java.io.IOException;
import java.io.OutputStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.LocalDateTime;
import java.util.zip.ZipEntry;
import java.util.zip.ZipOutputStream;

/** Where the files of a records folder go. */
interface Sink extends Closeable {

    /** Begins a file; the caller closes it before the next. */
    OutputStream create(String name) throws IOException;

    /** A folder, which is there. */
    static Sink folder(Path folder) {
        return new Sink() {
            @Override
            public OutputStream create(String name) throws IOException {
                return new BufferedOutputStream(Files.newOutputStream(folder.resolve(name)), 1 << 16);
            }

            @Override
            public void close() {
                // Nothing is held open between files.
            }
        };
    }

    /** A zip file. Its entries bear one time, so that equal records make equal files. */
    static Sink zip(Path file) throws IOException {
        ZipOutputStream zip = new ZipOutputStream(new BufferedOutputStream(Files.newOutputStream(file), 1 << 16));
        return new Sink() {
            @Override
            public OutputStream create(String name) throws IOException {
                ZipEntry entry = new ZipEntry(name);
                entry.setTimeLocal(LocalDateTime.of(1980, 1, 1, 0, 0));
                zip.putNextEntry(entry);
                return new FilterOutputStream(zip) {
                    @Override
                    public void write(byte[] bytes, int from, int length) throws IOException {
                        zip.write(bytes, from, length);
                    }

                    @Override
                    public void close() throws IOException {
                        zip.closeEntry();
                    }
                };
            }

            @Override
            public void close() throws IOException {
                zip.close();
            }
        };
    }
}
