package clipramp.runs;

import java.util.concurrent.CancellationException;

/** Follows long work and may end it. Asked and told by the thread that does the work. */
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

    /**
     * Tells how far the work is.
     *
     * @param done steps that are done, 0 or more
     * @param of steps in all, or the most that there will be
     */
    void progress(int done, int of);

    /** Whether the work is to end. */
    boolean isCancelled();

    /**
     * Tells how far the work is, unless it is to end.
     *
     * @param work what is done, such as "the search"
     * @param done steps that are done, 0 or more
     * @param of steps in all, or the most that there will be
     * @throws CancellationException where it is to end
     */
    default void step(String work, int done, int of) {
        if (isCancelled()) {
            throw new CancellationException(work + " was cancelled");
        }
        progress(done, of);
    }
}
