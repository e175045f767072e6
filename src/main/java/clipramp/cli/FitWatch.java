package clipramp.cli;

import clipramp.runs.Watch;
import java.util.Locale;

/**
 * A line on a terminal for work that takes longer than one would wait without a word: how many fits are made, and since
 * when. Nobody knows beforehand how many there will be. Closing wipes it.
 */
final class FitWatch implements Watch, AutoCloseable {
    private static final long QUIET_MILLIS = 1000;
    private static final long MILLIS_BETWEEN_LINES = 500;
    private static final String CLEARED = "\r" + " ".repeat(60) + "\r";

    private final Session session;
    private final long quietMillis;
    private final long began = System.nanoTime();
    private final Thread teller = new Thread(this::tell, "progress");
    private volatile int fits;
    private boolean told;

    FitWatch(Session session) {
        this(session, QUIET_MILLIS);
    }

    /**
     * @param quietMillis how long nothing is said, ms
     */
    FitWatch(Session session, long quietMillis) {
        this.session = session;
        this.quietMillis = quietMillis;
        if (session.terminal().interactive()) {
            teller.setDaemon(true);
            teller.start();
        }
    }

    private void tell() {
        try {
            Thread.sleep(quietMillis);
            while (true) {
                told = true;
                double seconds = (System.nanoTime() - began) * 1e-9;
                session.err()
                        .exactly(CLEARED
                                + String.format(
                                        Locale.ROOT, "fitting: %d made, %.0f s, Ctrl+C gives up", fits, seconds));
                session.err().flush();
                Thread.sleep(MILLIS_BETWEEN_LINES);
            }
        } catch (InterruptedException over) {
            if (told) {
                session.err().exactly(CLEARED);
                session.err().flush();
            }
        }
    }

    @Override
    public void progress(int done, int of) {
        fits = done;
    }

    @Override
    public boolean isCancelled() {
        return false;
    }

    @Override
    public void close() {
        teller.interrupt();
        try {
            teller.join();
        } catch (InterruptedException e) {
            Thread.currentThread().interrupt();
        }
    }
}
