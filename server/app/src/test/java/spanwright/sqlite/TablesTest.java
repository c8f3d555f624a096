package spanwright.sqlite;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.nio.file.Path;
import java.sql.Connection;
import java.sql.PreparedStatement;
import java.sql.ResultSet;
import java.sql.SQLException;
import java.sql.Statement;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.EnumSource;
import spanwright.journal.RecordKind;
import spanwright.journal.Recorded;
import spanwright.sqlite.rows.Column;
import spanwright.sqlite.rows.Layout;
import spanwright.sqlite.rows.Layouts;
import spanwright.sqlite.rows.SampleRecords;

/** The tables themselves: what the database refuses on its own, asked by plain SQL. */
class TablesTest {

    @TempDir
    private Path folder;

    private Connection connection;

    @BeforeEach
    void makeTables() throws SQLException {
        connection = Connections.writing(folder.resolve("tables.db"));
        Schema.create(connection);
    }

    @AfterEach
    void close() throws SQLException {
        connection.rollback();
        connection.close();
    }

    private void run(String sql) throws SQLException {
        try (Statement statement = connection.createStatement()) {
            statement.executeUpdate(sql);
        }
    }

    private String ask(String sql) throws SQLException {
        try (Statement statement = connection.createStatement();
                ResultSet row = statement.executeQuery(sql)) {
            return row.next() ? row.getString(1) : "";
        }
    }

    @ParameterizedTest
    @EnumSource(RecordKind.class)
    void a_table_has_exactly_the_columns_of_its_layout(RecordKind kind) throws SQLException {
        Layout layout = Layouts.of(kind);
        List<String> columns = new ArrayList<>();
        try (Statement statement = connection.createStatement();
                ResultSet rows = statement.executeQuery("PRAGMA table_info(" + layout.table() + ")")) {
            while (rows.next()) {
                columns.add(rows.getString("name") + " " + rows.getString("type"));
            }
        }

        assertThat(columns)
                .isEqualTo(layout.columns().stream()
                        .map(column -> column.name() + " " + column.type())
                        .toList());
    }

    @Test
    void every_table_is_strict() throws SQLException {
        assertThat(ask("SELECT group_concat(name) FROM pragma_table_list"
                        + " WHERE schema = 'main' AND NOT strict AND name NOT LIKE 'sqlite_%'"))
                .isNull();
    }

    @ParameterizedTest
    @EnumSource(RecordKind.class)
    void records_of_every_kind_come_back_as_they_were(RecordKind kind) throws SQLException {
        run("PRAGMA ignore_check_constraints = ON");
        SampleRecords samples = new SampleRecords(7);
        Layout layout = Layouts.of(kind);
        TableWriter writer = new TableWriter(connection, layout);
        List<Recorded> written = new ArrayList<>();
        for (int id = 1; id <= 30; id++) {
            Recorded record = samples.draw(kind, id);
            run("DELETE FROM " + layout.table());
            writer.add(record);
            writer.flushAdded();
            written.add(record);
            String columns = String.join(
                    ", ", layout.columns().stream().map(Column::name).toList());
            try (Statement statement = connection.createStatement();
                    ResultSet rows = statement.executeQuery("SELECT " + columns + " FROM " + layout.table())) {
                ResultRow row = new ResultRow(rows);
                assertThat(row.next()).isTrue();
                assertThat(layout.read(row)).isEqualTo(record);
            }
        }
        assertThat(written).hasSize(30);
    }

    private void plant() throws SQLException {
        run("INSERT INTO structure VALUES (1, 'P-1', 'pole', 8, 47, NULL, NULL, 'in service', '', NULL)");
        run("INSERT INTO structure VALUES (2, 'P-2', 'pole', 8, 47, NULL, NULL, 'in service', '', NULL)");
        run("INSERT INTO span VALUES (1, 'S-1', 1, 2, 'aerial', NULL, NULL, 'in service', '', NULL)");
        run("INSERT INTO cable_type VALUES (1, '12F', 12, 12, 'G.652.D', 0, 0, NULL, 'TIA-598')");
        run("INSERT INTO cable VALUES (1, 'F-1', 1, NULL, 'white', NULL, NULL, NULL, 'in service', NULL)");
        run("INSERT INTO run_row VALUES (1, 1, 0, 1, NULL, 0, 'posted', NULL, NULL)");
        run("INSERT INTO run_row VALUES (2, 1, 1, 2, 1, 0, 'posted', NULL, NULL)");
        run("INSERT INTO enclosure VALUES (1, 'E-1', 1, 'closure', 0, 'in service', NULL)");
        run("INSERT INTO enclosure VALUES (2, 'E-2', 1, 'closure', 0, 'in service', NULL)");
        run("INSERT INTO pass VALUES (1, 1, 1, 1, '', '')");
        run("INSERT INTO panel VALUES (1, 1, 'P', 12, 'SC/APC')");
        run("INSERT INTO splitter VALUES (1, 1, 'S1', 1, 4, NULL, '')");
        run(
                "INSERT INTO circuit VALUES (1, 'C-1', NULL, NULL, 3, 1, '1310000', NULL, NULL, 1, 1, 1, 1, 2, 2, 'working')");
        run("INSERT INTO joined_end VALUES (100, 1), (200, 1)");
        run("INSERT INTO planned_end VALUES ('J', 100, 200, 2), ('J', 200, 100, 2)");
        run("INSERT INTO front_use VALUES (500, 1, 0), (501, 0, 1)");
        run("INSERT INTO posting VALUES (1, '2026-03-31T14:05:00.000000Z', 'Ana', 'as built', 1, x'00', NULL, NULL)");
        connection.commit();
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "a structure's code twice | INSERT INTO structure VALUES (3, 'P-1', 'pole', 8, 47, NULL, NULL, 'planned', '', NULL)",
                "a span's code twice | INSERT INTO span VALUES (2, 'S-1', 1, 2, 'aerial', NULL, NULL, 'planned', '', NULL)",
                "a cable's code twice | INSERT INTO cable VALUES (2, 'F-1', 1, NULL, 'white', NULL, NULL, NULL, 'planned', NULL)",
                "a cable type's code twice | INSERT INTO cable_type VALUES (2, '12F', 12, 12, 'x', 0, 0, NULL, 'x')",
                "an enclosure's code twice | INSERT INTO enclosure VALUES (3, 'E-1', 1, 'closure', 0, 'planned', NULL)",
                "a panel's code twice in an enclosure | INSERT INTO panel VALUES (2, 1, 'P', 12, 'SC/APC')",
                "a splitter's code twice in an enclosure | INSERT INTO splitter VALUES (2, 1, 'S1', 1, 4, NULL, '')",
                "a circuit's code twice | UPDATE circuit SET id = 2; INSERT INTO circuit SELECT 1, code, service, customer, priority, customers_served, wavelengths_pm, budget, protection_group, a_panel, a_first, a_last, z_panel, z_first, z_last, status FROM circuit",
                "a second enclosure on a run row | INSERT INTO pass VALUES (2, 2, 1, 1, '', '')",
                "a row of a run twice | INSERT INTO run_row VALUES (3, 1, 1, 2, 1, 0, 'posted', NULL, NULL)",
                "an end joined twice | INSERT INTO joined_end VALUES (100, 2)",
                "an end joined twice, standing on the other side | INSERT INTO joined_end VALUES (300, 2), (200, 2)",
                "an end joined to itself | INSERT INTO joined_end VALUES (300, 2), (300, 2)",
                "an end used twice within a job | INSERT INTO planned_end VALUES ('J', 200, 300, 3)",
                "a second jumper on a front | UPDATE front_use SET jumpers = 2 WHERE end_key = 500",
                "a circuit on a front with a jumper | UPDATE front_use SET circuit_ends = 1 WHERE end_key = 500",
                "a jumper on a front with a circuit | UPDATE front_use SET jumpers = 1 WHERE end_key = 501",
                "a posting's number twice | INSERT INTO posting VALUES (1, 'x', 'x', 'x', 0, x'00', NULL, NULL)",
                "a small posting's page of no table | INSERT INTO posting VALUES (2, 'x', 'x', 'x', 0, x'00', NULL, x'00')",
                "a splitter with three inputs | INSERT INTO splitter VALUES (2, 1, 'S2', 3, 4, NULL, '')",
                "text where a number belongs | INSERT INTO panel VALUES (2, 1, 'Q', 'twelve', 'SC/APC')",
                "a side that is none | INSERT INTO joint VALUES (1, 'splice', 1, 'up', 1, 1, 1, 'back', 1, 2, 2, NULL, NULL, NULL, 'posted', NULL, NULL, NULL, NULL, NULL, NULL)",
                "sides unlike in count | INSERT INTO joint VALUES (1, 'splice', 1, 'back', 1, 1, 2, 'back', 1, 3, 3, NULL, NULL, NULL, 'posted', NULL, NULL, NULL, NULL, NULL, NULL)",
            })
    void the_database_refuses(String what, String sql) throws SQLException {
        plant();

        assertThatThrownBy(() -> run(sql))
                .as(what)
                .isInstanceOf(SQLException.class)
                .hasMessageContaining("CONSTRAINT");
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "a span to nowhere | UPDATE span SET to_structure = 9",
                "a structure that a run still visits | DELETE FROM structure WHERE id = 2",
                "a joint in no enclosure | INSERT INTO joint VALUES (1, 'splice', 9, 'back', 1, 1, 1, 'back', 1, 2, 2, NULL, NULL, NULL, 'posted', NULL, NULL, NULL, NULL, NULL, NULL)",
                "a pass of no cable | UPDATE pass SET cable = 9",
                "a panel that circuits end on | DELETE FROM panel",
                "a page of no posting | INSERT INTO posting_page VALUES (9, 1, 'span', x'00')",
            })
    void the_database_refuses_at_the_commit(String what, String sql) throws SQLException {
        plant();
        run(sql);

        assertThatThrownBy(connection::commit).as(what).hasMessageContaining("FOREIGN KEY");
    }

    @Test
    void a_job_may_plan_for_an_end_that_is_in_use_and_so_may_another_job() throws SQLException {
        plant();
        run("INSERT INTO planned_end VALUES ('K', 100, 300, 3), ('K', 300, 100, 3)");
        connection.commit();

        assertThat(ask("SELECT count(*) FROM planned_end")).isEqualTo("4");
    }

    @Test
    void pages_are_found_by_posting() throws SQLException {
        plant();
        try (PreparedStatement plan = connection.prepareStatement(
                        "EXPLAIN QUERY PLAN SELECT of_table, rows FROM posting_page WHERE posting = 1 ORDER BY page");
                ResultSet row = plan.executeQuery()) {
            assertThat(row.getString("detail")).startsWith("SEARCH").contains("PRIMARY KEY");
        }
    }
}
