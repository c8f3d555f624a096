package spanwright;

import org.junit.jupiter.api.Test;
import spanwright.architecture.Program;

class ProgramArchitectureTest {

    private static final Program PROGRAM = Program.under("spanwright");

    @Test
    void adapters_never_use_each_other() {
        PROGRAM.keepsApart("sqlite", "exchange", "http", "cli");
        PROGRAM.keepsApart("sqlite", "exchange", "paper");
    }

    @Test
    void only_boot_sees_all() {
        PROGRAM.hasOnTop("boot");
    }

    @Test
    void no_package_reaches_itself_through_others() {
        PROGRAM.hasNoPackageCycles();
    }

    @Test
    void SQL_stays_with_the_storage() {
        PROGRAM.only("sqlite", "boot").use("java.sql..", "javax.sql..", "org.sqlite..", "org.jdbi..", "org.flywaydb..");
    }

    @Test
    void the_web_server_stays_with_the_HTTP_interface() {
        PROGRAM.only("http", "boot").use("io.javalin..", "jakarta..", "org.eclipse.jetty..");
    }

    @Test
    void the_command_line_stays_with_its_adapter() {
        PROGRAM.only("cli", "boot").use("picocli..");
    }

    @Test
    void what_makes_PDF_stays_with_the_paper() {
        PROGRAM.only("paper")
                .use("com.openhtmltopdf..", "org.apache.pdfbox..", "org.apache.fontbox..", "com.google.zxing..");
    }

    @Test
    void packages_and_types_are_named_in_words_of_the_trade() {
        PROGRAM.isNamedInWordsOfItsTrade();
    }
}
