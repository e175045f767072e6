package clipramp.engine;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;

/** What is remembered of pieces is what was kept of the same state and visit, and of nothing else. */
class SwiftMemoryTest {
    private static final int STATE = SwiftLaws.RECTIFIES | SwiftLaws.CLIPS;

    private final SwiftMemory memory = new SwiftMemory();
    private final SwiftPiece piece = piece();

    SwiftMemoryTest() {
        // Every unit begins like this, the first one too.
        memory.forget();
        memory.start();
    }

    /** At 30 degrees of the supply, 4 V of exponential. */
    private static SwiftPiece piece() {
        SwiftPiece piece = new SwiftPiece(new double[64]);
        piece.take(1000, 3e-3);
        piece.begin(0, 0, 1, 4, 0.5, Math.sqrt(0.75));
        return piece;
    }

    /** Looks a span ahead, as what would have been found, and keeps that. */
    private void keep(int target, double seconds) {
        piece.lookAfter(seconds, Math.exp(-500 * seconds), Math.sin(1000 * seconds), Math.cos(1000 * seconds));
        memory.keep(piece, target, Math.exp(-500 * seconds));
    }

    private int recall(int state, boolean falling) {
        piece.lookAfter(0, 1, 0, 1);
        return memory.recall(piece, state, falling);
    }

    @Test
    void nothingKeptIsNothingRecalled() {
        assertThat(recall(STATE, false)).isEqualTo(SwiftPiece.NONE);
        assertThat(memory.usual(SwiftLaws.ZENER)).isEqualTo(SwiftLaws.ZENER);
    }

    @Test
    void theSameStateIsLookedAtWhereItEnded() {
        recall(STATE, false);
        keep(SwiftLaws.DEVICE, 2e-4);
        memory.start();
        assertThat(recall(STATE, false)).isEqualTo(SwiftLaws.DEVICE);
        assertThat(piece.ahead).isEqualTo(2e-4);
        assertThat(piece.x).isCloseTo(4 * Math.exp(-0.1), within(1e-14));
        assertThat(piece.s).isCloseTo(Math.sin(Math.PI / 6 + 0.2), within(1e-14));
        assertThat(piece.c).isCloseTo(Math.cos(Math.PI / 6 + 0.2), within(1e-14));
    }

    @Test
    void anotherStateOrAFallingSupplyIsNotTheSame() {
        recall(STATE, false);
        keep(SwiftLaws.DEVICE, 2e-4);
        memory.start();
        assertThat(recall(STATE, true)).isEqualTo(SwiftPiece.NONE);
        assertThat(recall(STATE | SwiftLaws.ON, false)).isEqualTo(SwiftPiece.NONE);
        assertThat(recall(0, false)).isEqualTo(SwiftPiece.NONE);
    }

    @Test
    void aPieceThatEndedWithTheHalfCycleLeavesNothingToLookFor() {
        recall(STATE, false);
        keep(SwiftPiece.END, 2e-4);
        memory.start();
        assertThat(recall(STATE, false)).isEqualTo(SwiftPiece.NONE);
    }

    /** Pulse by pulse, the second visit of a state is remembered apart; a first second visit is guessed from the first. */
    @Test
    void everyVisitIsRememberedApart() {
        recall(STATE, false);
        keep(SwiftLaws.DEVICE, 2e-4);
        assertThat(recall(STATE, false)).isEqualTo(SwiftLaws.DEVICE);
        assertThat(piece.ahead).isEqualTo(2e-4);
        keep(SwiftLaws.ZENER, 3e-4);
        memory.start();
        recall(STATE, false);
        assertThat(piece.ahead).isEqualTo(2e-4);
        assertThat(recall(STATE, false)).isEqualTo(SwiftLaws.ZENER);
        assertThat(piece.ahead).isEqualTo(3e-4);
    }

    @Test
    void moreVisitsThanItKeepsShareTheLast() {
        for (int visit = 1; visit <= 40; visit++) {
            recall(STATE | SwiftLaws.ON | SwiftLaws.GATE, true);
            keep(SwiftLaws.DEVICE, visit * 1e-5);
        }
        memory.start();
        for (int visit = 1; visit <= 23; visit++) {
            recall(STATE | SwiftLaws.ON | SwiftLaws.GATE, true);
            assertThat(piece.ahead).isEqualTo(visit * 1e-5);
        }
        recall(STATE | SwiftLaws.ON | SwiftLaws.GATE, true);
        assertThat(piece.ahead).isEqualTo(40e-5);
    }

    @Test
    void ofAnotherUnitOnlyWhatUsuallyHappensIsKnown() {
        recall(STATE, false);
        keep(SwiftLaws.ZENER, 2e-4);
        memory.forget();
        memory.start();
        assertThat(recall(STATE, false)).isEqualTo(SwiftPiece.NONE);
        assertThat(piece.ahead).as("looked at nowhere").isZero();
        assertThat(memory.usual(SwiftLaws.DEVICE)).isEqualTo(SwiftLaws.ZENER);
        recall(STATE, false);
        assertThat(memory.usual(SwiftLaws.DEVICE))
                .as("a second visit was never seen")
                .isEqualTo(SwiftLaws.DEVICE);
    }
}
