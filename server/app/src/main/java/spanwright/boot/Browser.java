package spanwright.boot;

import java.io.IOException;
import java.net.URI;
import java.util.List;
import java.util.Locale;

/** Opens a page in the browser that the person's system names. */
final class Browser {

    private Browser() {}

    static void open(URI page) {
        try {
            new ProcessBuilder(command(System.getProperty("os.name", ""), page))
                    .redirectErrorStream(true)
                    .redirectOutput(ProcessBuilder.Redirect.DISCARD)
                    .start();
        } catch (IOException none) {
            // A machine without a browser: the address was printed, and that is enough.
            return;
        }
    }

    static List<String> command(String system, URI page) {
        String name = system.toLowerCase(Locale.ROOT);
        if (name.contains("mac")) {
            return List.of("open", page.toString());
        }
        return name.contains("win")
                ? List.of("rundll32", "url.dll,FileProtocolHandler", page.toString())
                : List.of("xdg-open", page.toString());
    }
}
