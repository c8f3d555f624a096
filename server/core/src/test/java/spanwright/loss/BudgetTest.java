package spanwright.loss;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import spanwright.quantity.Loss;

class BudgetTest {

    /**
     * The classes follow from transmitter and receiver powers in dBm: maximum = least sent - sensitivity - penalty (1 dB,
     * for B+ 0.5), minimum = most sent - overload. Powers from memory of ITU-T G.984.2, G.987.2 and G.9807.1; of C+ the
     * minimum is upstream's: +5 sent into an overload of -12.
     */
    @ParameterizedTest
    @CsvSource({
        "A, 0, 4, -21, -1, 1",
        "B, 5, 9, -21, -1, 1",
        "B+, 1.5, 5, -27, -8, 0.5",
        "C, 3, 7, -28, -8, 1",
        "C+, 3, 5, -30, -12, 1",
        "N1, 2, 5, -28, -9, 1",
        "N2, 4, 7, -28, -9, 1",
        "E1, 6, 9, -28, -9, 1",
        "E2, 8, 11, -28, -9, 1"
    })
    void a_class_follows_from_its_powers(
            String code, double least, double most, double sensitivity, double overload, double penalty) {
        Budget budget = Budget.find(code).orElseThrow();

        assertThat(budget.max()).isEqualTo(Loss.ofDecibels(least - sensitivity - penalty));
        assertThat(budget.min()).isEqualTo(Loss.ofDecibels(most - overload));
        assertThat(budget.source()).contains("ITU-T");
    }

    @Test
    void there_are_nine_classes_and_anything_else_is_a_number_or_nothing() {
        assertThat(Budget.listClasses().stream().map(Budget::code))
                .containsExactly("A", "B", "B+", "C", "C+", "N1", "N2", "E1", "E2");
        assertThat(Budget.find("28.5").orElseThrow()).isEqualTo(Budget.of(Loss.ofDecibels(28.5)));
        for (String nothing : new String[] {"", "b+", "D", "-3", "1e3", "28 dB", ".5"}) {
            assertThat(Budget.find(nothing)).as(nothing).isEmpty();
        }
    }

    @Test
    void too_little_loss_overloads_the_receiver_of_a_class() {
        Budget bPlus = Budget.find("B+").orElseThrow();

        assertThat(check(bPlus, 12.999999, 20).overload()).isTrue();
        assertThat(check(bPlus, 13, 20).overload()).isFalse();
        assertThat(check(Budget.of(Loss.ofDecibels(28)), 0, 0).overload()).isFalse();
    }

    @Test
    void it_passes_up_to_the_budget_less_the_margin_expected_and_at_the_limit() {
        BudgetCheck check = new BudgetCheck(
                Budget.find("B+").orElseThrow(), Loss.ofDecibels(3), Loss.ofDecibels(25), Loss.ofDecibels(25.000001));

        assertThat(check.passes()).isTrue();
        assertThat(check.left()).isEqualTo(Loss.ZERO);
        assertThat(check.passesAtLimit()).isFalse();
        assertThat(check(Budget.find("B+").orElseThrow(), 28.5, 28).passes()).isFalse();
        assertThat(check(Budget.find("B+").orElseThrow(), 28.5, 28).left()).isEqualTo(Loss.ofDecibels(-0.5));
        assertThat(check(Budget.find("B+").orElseThrow(), 20, 28).passesAtLimit())
                .isTrue();
    }

    private static BudgetCheck check(Budget budget, double expected, double limit) {
        return new BudgetCheck(budget, Loss.ZERO, Loss.ofDecibels(expected), Loss.ofDecibels(limit));
    }
}
