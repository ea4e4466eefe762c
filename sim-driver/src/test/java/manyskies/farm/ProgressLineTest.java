package manyskies.farm;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.PrintWriter;
import java.io.StringWriter;
import java.time.Clock;
import java.time.Duration;
import java.time.Instant;
import java.time.ZoneId;
import java.time.ZoneOffset;
import manyskies.result.BlockId;
import org.junit.jupiter.api.Test;

/** Exact: a clock set by hand, numbers worked out by hand. */
class ProgressLineTest {
    private final StringWriter text = new StringWriter();
    private final HandClock clock = new HandClock();

    private ProgressLine line(boolean terminal, int realisations) {
        return new ProgressLine(new PrintWriter(text), terminal, realisations, 8, clock);
    }

    private static BlockId block(int number) {
        return new BlockId("data", number, 4 * number, 4);
    }

    /** Two blocks in 20 s warm up; then 4 realisations in 2 s: 2 a second, 28 more in 14 s. */
    @Test
    void theRateForgetsTheWarmUp() {
        ProgressLine line = line(true, 40);
        clock.forward(20);
        line.blockDone(block(0));
        line.blockDone(block(1));
        clock.forward(2);
        line.blockDone(block(2));
        assertThat(text.toString())
                .endsWith("\r\u001b[K12 of 40 realisations, 2.0 a second, ends about 12:00:36");
    }

    @Test
    void slowWorkIsCountedByTheMinute() {
        ProgressLine line = line(true, 40);
        line.blockDone(block(0));
        line.blockDone(block(1));
        clock.forward(60);
        line.blockDone(block(2));
        assertThat(text.toString()).contains("4.0 a minute, ends about 12:08:00");
    }

    /** The first block of several in progress says nothing yet about the rate of all. */
    @Test
    void beforeTheWarmUpNoRateIsClaimed() {
        ProgressLine line = line(true, 40);
        clock.forward(60);
        line.blockDone(block(0));
        line.blockDone(block(1));
        assertThat(text.toString()).endsWith("\r\u001b[K8 of 40 realisations");
    }

    @Test
    void anEndOnAnotherDayHasItsDate() {
        ProgressLine line = line(true, 4000);
        line.blockDone(block(0));
        line.blockDone(block(1));
        clock.forward(60);
        line.blockDone(block(2));
        assertThat(text.toString()).contains("ends about 2026-03-02 04:38");
    }

    @Test
    void withoutATerminalALineComesEveryThirtySeconds() {
        ProgressLine line = line(false, 400);
        for (int number = 0; number < 20; number++) {
            clock.forward(5);
            line.blockDone(block(number));
        }
        assertThat(text.toString().lines())
                .hasSize(3)
                .noneMatch(l -> l.contains("\r"))
                .first()
                .asString()
                .startsWith("24 of 400 realisations");
    }

    @Test
    void theLineIsErasedBeforeOtherThingsArePrinted() {
        ProgressLine line = line(true, 40);
        clock.forward(1);
        line.blockDone(block(0));
        line.blockFailed(new BlockFailure(block(1), "block data-000001: broken", "", false));
        assertThat(text.toString()).endsWith("\r\u001b[Kblock data-000001: broken\n");
        line.blockDone(block(2));
        line.close();
        assertThat(text.toString()).endsWith("\r\u001b[K");
    }

    private static final class HandClock extends Clock {
        private Instant now = Instant.parse("2026-03-01T12:00:00Z");

        void forward(long seconds) {
            now = now.plus(Duration.ofSeconds(seconds));
        }

        @Override
        public ZoneId getZone() {
            return ZoneOffset.UTC;
        }

        @Override
        public Clock withZone(ZoneId zone) {
            return this;
        }

        @Override
        public Instant instant() {
            return now;
        }
    }
}
