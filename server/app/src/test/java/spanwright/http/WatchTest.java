package spanwright.http;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.catchThrowableOfType;

import java.time.Duration;
import org.junit.jupiter.api.Test;
import spanwright.answers.Json;
import spanwright.answers.Unanswerable;

class WatchTest {

    @Test
    void an_answer_that_takes_too_long_is_stopped_at_its_next_object() {
        try (Watch watch = new Watch(Duration.ofMillis(20))) {
            watch.begin();
            Unanswerable stopped = catchThrowableOfType(Unanswerable.class, WatchTest::answerWithoutEnd);
            watch.end();

            assertThat(stopped.kind()).isEqualTo(Unanswerable.Kind.TOO_SLOW);
            assertThat(Problem.of(stopped).status()).isEqualTo(503);
            assertThat(Thread.currentThread().isInterrupted()).isFalse();
        }
    }

    @Test
    void an_answer_in_time_is_not_stopped_nor_the_one_after_it() {
        try (Watch watch = new Watch(Duration.ofSeconds(30))) {
            watch.begin();
            assertThat(Json.bytes(json -> json.text("a", "b"))).isNotEmpty();
            watch.end();
            assertThat(Thread.currentThread().isInterrupted()).isFalse();
        }
    }

    private static void answerWithoutEnd() {
        Json.bytes(json -> json.list("items", items -> {
            for (int item = 0; item < 10_000_000; item++) {
                items.objectHere(empty -> Thread.onSpinWait());
            }
        }));
    }
}
