package spanwright.browser;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.attribute.PosixFilePermissions;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class ChromiumTest {

    @TempDir
    private Path folder;

    @Test
    void the_first_executable_of_its_names_on_the_path_is_taken() throws IOException {
        Files.createDirectory(folder.resolve("chromium"));
        Path notExecutable = Files.createDirectory(folder.resolve("a")).resolve("chromium");
        Files.createFile(notExecutable);
        Path browser = Files.createDirectory(folder.resolve("b")).resolve("google-chrome");
        Files.createFile(browser, PosixFilePermissions.asFileAttribute(PosixFilePermissions.fromString("rwxr-xr-x")));

        assertThat(Chromium.find(folder.resolve("a") + ":" + folder.resolve("b")))
                .contains(browser);
    }
}
