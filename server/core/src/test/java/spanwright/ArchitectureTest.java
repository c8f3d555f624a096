package spanwright;

import org.junit.jupiter.api.Test;
import spanwright.architecture.PackageOrder;
import spanwright.architecture.Program;

class ArchitectureTest {

    private static final Program CORE = Program.under("spanwright");

    private static final PackageOrder ORDER = CORE.first("quantity")
            .then("paged")
            .then("journal")
            .then("plant")
            .then("splicing")
            .then("circuits")
            .then("records")
            .then("network")
            .then("trace")
            .then("loss")
            .then("check")
            .then("planning")
            .then("outage")
            .then("fault")
            .then("suspicion")
            .then("temporary")
            .then("incident")
            .then("repair")
            .then("sheet")
            .then("draft");

    @Test
    void each_package_uses_only_those_before_it() {
        ORDER.holds();
    }

    @Test
    void every_package_has_its_place_in_the_order() {
        ORDER.namesEveryPackage();
    }

    @Test
    void no_package_reaches_itself_through_others() {
        CORE.hasNoPackageCycles();
    }

    @Test
    void the_domain_knows_nothing_of_SQL_HTTP_JSON_or_a_command_line() {
        CORE.usesNothingOf(
                "java.sql..",
                "javax.sql..",
                "org.sqlite..",
                "org.jdbi..",
                "org.flywaydb..",
                "java.net.http..",
                "com.sun.net.httpserver..",
                "io.javalin..",
                "jakarta..",
                "com.fasterxml..",
                "picocli..");
    }

    @Test
    void packages_and_types_are_named_in_words_of_the_trade() {
        CORE.isNamedInWordsOfItsTrade();
    }
}
