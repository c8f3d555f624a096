package spanwright.browser;

import java.io.File;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.TimeUnit;
import java.util.stream.Stream;

/**
 * Where the browser is that the tests drive: one already on the machine, else Debian's package, installed when the
 * tests run as root. Never a download of the browser library's own.
 */
final class Chromium {

    private static final List<String> NAMES =
            List.of("chromium", "chromium-browser", "google-chrome", "google-chrome-stable");
    private static final String MAC = "/Applications/Google Chrome.app/Contents/MacOS/Google Chrome";
    private static final long INSTALL_MINUTES = 15;

    private Chromium() {}

    /**
     * The browser's executable, installed first where there is none.
     *
     * @throws IllegalStateException saying what to install, where there is none and it cannot be installed from here
     */
    static synchronized Path executable() {
        Optional<Path> found = find(System.getenv().getOrDefault("PATH", ""));
        if (found.isPresent()) {
            return found.get();
        }
        if (!isRootOnDebian()) {
            throw new IllegalStateException("The browser tests need Chromium: install it (Debian: apt-get install "
                    + "chromium fonts-dejavu-core) so that one of " + NAMES + " is on the PATH, and run them again.");
        }
        run("apt-get", "-q", "update");
        // The fonts come along because without any, text is drawn as empty boxes.
        run("apt-get", "-q", "-y", "--no-install-recommends", "install", "chromium", "fonts-dejavu-core");
        return find("/usr/bin")
                .orElseThrow(() -> new IllegalStateException("Chromium's package is installed, but none of " + NAMES
                        + " is in /usr/bin: put it on the PATH."));
    }

    /** The first of the browser's names in the folders of {@code path}, a list such as the PATH of a shell. */
    static Optional<Path> find(String path) {
        Stream<Path> onPath = NAMES.stream()
                .flatMap(name -> Stream.of(path.split(File.pathSeparator, -1))
                        .filter(folder -> !folder.isEmpty())
                        .map(folder -> Path.of(folder, name)));
        return Stream.concat(onPath, Stream.of(Path.of(MAC)))
                .filter(Files::isExecutable)
                .findFirst();
    }

    private static boolean isRootOnDebian() {
        return "root".equals(System.getProperty("user.name")) && Files.isExecutable(Path.of("/usr/bin/apt-get"));
    }

    private static void run(String... command) {
        List<String> inDebian = new ArrayList<>(List.of("env", "DEBIAN_FRONTEND=noninteractive"));
        inDebian.addAll(List.of(command));
        try {
            Path output = Files.createTempFile("apt-get", ".log");
            Process process = new ProcessBuilder(inDebian)
                    .redirectErrorStream(true)
                    .redirectOutput(output.toFile())
                    .start();
            boolean ended = process.waitFor(INSTALL_MINUTES, TimeUnit.MINUTES);
            if (!ended) {
                process.destroy();
            }
            if (!ended || process.exitValue() != 0) {
                throw new IllegalStateException("The browser tests need Chromium, and \"" + String.join(" ", command)
                        + "\" failed: install it by hand. It said:\n" + Files.readString(output));
            }
            Files.delete(output);
        } catch (IOException cause) {
            throw new IllegalStateException("The browser tests need Chromium: install it by hand.", cause);
        } catch (InterruptedException cause) {
            Thread.currentThread().interrupt();
            throw new IllegalStateException("Interrupted while Chromium was being installed.", cause);
        }
    }
}
