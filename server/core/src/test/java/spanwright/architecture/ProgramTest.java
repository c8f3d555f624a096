package spanwright.architecture;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatCode;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import org.junit.jupiter.api.Test;

/** The rules of structure find what breaks them, shown on the small program below {@code sample}. */
class ProgramTest {

    private static final Program SAMPLE = Program.withTestsUnder("sample");

    @Test
    void a_package_that_uses_a_later_one_is_named() {
        assertThatThrownBy(() -> SAMPLE.first("low").then("high").holds())
                .isInstanceOf(AssertionError.class)
                .hasMessageContaining("sample.low.Low")
                .hasMessageContaining("sample.high.High");
    }

    @Test
    void packages_of_one_step_do_not_use_each_other() {
        assertThatThrownBy(() -> SAMPLE.first("high", "low").holds()).isInstanceOf(AssertionError.class);
        assertThatThrownBy(() -> SAMPLE.keepsApart("high", "low")).isInstanceOf(AssertionError.class);
        assertThatCode(() -> SAMPLE.first("util", "low").holds()).doesNotThrowAnyException();
    }

    @Test
    void a_package_missing_from_the_order_is_named() {
        assertThatThrownBy(() -> SAMPLE.first("low").then("high").namesEveryPackage())
                .isInstanceOf(AssertionError.class)
                .hasMessageContaining("util");
        assertThatCode(() -> SAMPLE.first("low").then("high", "util", "absent").namesEveryPackage())
                .doesNotThrowAnyException();
    }

    @Test
    void a_cycle_is_named() {
        assertThatThrownBy(SAMPLE::hasNoPackageCycles)
                .isInstanceOf(AssertionError.class)
                .hasMessageContaining("Cycle detected");
    }

    @Test
    void what_may_not_be_used_is_found() {
        assertThatThrownBy(() -> SAMPLE.usesNothingOf("java.sql..")).isInstanceOf(AssertionError.class);
        assertThatThrownBy(() -> SAMPLE.only("high").use("java.sql..")).isInstanceOf(AssertionError.class);
        assertThatCode(() -> SAMPLE.only("low").use("java.sql..")).doesNotThrowAnyException();
    }

    @Test
    void use_of_the_top_from_below_is_found() {
        assertThatThrownBy(() -> SAMPLE.hasOnTop("high")).isInstanceOf(AssertionError.class);
        assertThatCode(() -> SAMPLE.hasOnTop("util")).doesNotThrowAnyException();
    }

    @Test
    void names_without_meaning_are_found_in_packages_and_types() {
        assertThatThrownBy(SAMPLE::isNamedInWordsOfItsTrade)
                .isInstanceOf(AssertionError.class)
                .hasMessageContaining("sample.util.Words")
                .hasMessageContaining("sample.high.LengthHelper");
    }

    @Test
    void the_program_is_read_without_its_tests() {
        assertThat(Program.under("sample").packages()).isEmpty();
    }
}
