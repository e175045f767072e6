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

    /** Whether to stop and tell what there is. */
    boolean isCancelled();
}
