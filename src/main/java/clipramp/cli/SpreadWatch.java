package clipramp.cli;

import clipramp.runs.Watch;
import clipramp.spread.SpreadWords;
import java.util.concurrent.CountDownLatch;
import java.util.concurrent.TimeUnit;
import java.util.concurrent.atomic.AtomicBoolean;

/**
 * Progress on a terminal, and an interrupt that ends the run but lets it tell what it has: the process waits for the
 * answer before it goes.
 */
final class SpreadWatch implements Watch, AutoCloseable {
    private static final long LONGEST_WAIT_SECONDS = 10;
    private static final long NANOS_BETWEEN_LINES = 200_000_000L;
    private static final String CLEARED = "\r" + " ".repeat(72) + "\r";

    private final Session session;
    private final boolean shown;
    private final long began = System.nanoTime();
    private final AtomicBoolean interrupted = new AtomicBoolean();
    private final CountDownLatch answered = new CountDownLatch(1);
    private final Thread hook = new Thread(this::interrupt, "interrupt");
    private long lastLine = began;

    SpreadWatch(Session session) {
        this.session = session;
        shown = session.terminal().interactive();
        Runtime.getRuntime().addShutdownHook(hook);
    }

    private void interrupt() {
        interrupted.set(true);
        try {
            answered.await(LONGEST_WAIT_SECONDS, TimeUnit.SECONDS);
        } catch (InterruptedException goes) {
            Thread.currentThread().interrupt();
        }
    }

    @Override
    public void progress(int done, int of) {
        long now = System.nanoTime();
        if (!shown || done >= of || now - lastLine < NANOS_BETWEEN_LINES) {
            return;
        }
        lastLine = now;
        String line = SpreadWords.progress(done, of, (now - began) * 1e-9);
        session.err().exactly(CLEARED + line);
        session.err().flush();
    }

    @Override
    public boolean isCancelled() {
        return interrupted.get();
    }

    /** Wipes the progress line. */
    void clear() {
        if (shown) {
            session.err().exactly(CLEARED);
            session.err().flush();
        }
    }

    @Override
    public void close() {
        answered.countDown();
        if (!interrupted.get()) {
            Runtime.getRuntime().removeShutdownHook(hook);
        }
    }
}
