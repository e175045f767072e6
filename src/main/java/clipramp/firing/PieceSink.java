package clipramp.firing;

import clipramp.engine.Piece;

/** Is shown every piece of a half cycle in turn. */
interface PieceSink {
    /** Nobody looks. */
    PieceSink NONE = new PieceSink() {
        @Override
        public void passed(Piece piece, double fromSeconds, double toSeconds) {}

        @Override
        public void takeBack(double fromSeconds) {}
    };

    /** The circuit went through a piece between two times since the line zero, s. The piece is valid in the call only. */
    void passed(Piece piece, double fromSeconds, double toSeconds);

    /** Forget every piece that began at or after a time, s: the pulse is computed again with the supply kept. */
    void takeBack(double fromSeconds);
}
