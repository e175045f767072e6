package clipramp.spread;

/** Follows a run and may end it. */
public interface Watch {
    /** Looks on in silence. */
    Watch NONE = new Watch() {
        @Override
        public void progress(int done, int of) {}

        @Override
        public boolean isCancelled() {
            return false;
        }
    };

    /** So many units of so many are drawn. */
    void progress(int done, int of);

    /** How the units drawn so far lie at mid-knob; told after {@link #progress}. */
    default void drawn(Histogram midKnob) {}

    /** Whether to stop and tell what there is. */
    boolean isCancelled();
}
