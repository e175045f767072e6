package clipramp.desk;

import java.lang.management.ManagementFactory;
import java.lang.management.ThreadMXBean;
import java.nio.file.Files;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Locale;
import java.util.concurrent.Semaphore;
import javafx.application.Platform;

/**
 * How long the window's thread is busy in one go while the first design opens, in milliseconds of its processor time, which
 * other work on the machine moves little: {@code OpenSpeed}.
 */
public final class OpenSpeed {
    private static final int SHOWN = 6;

    private OpenSpeed() {}

    public static void main(String[] arguments) throws Exception {
        Harness window = Harness.start(Files.createTempDirectory("open"));
        Thread.sleep(3000);
        List<Double> blocks = Collections.synchronizedList(new ArrayList<>());
        Thread listening = new Thread(() -> listen(blocks), "listening");
        listening.setDaemon(true);
        listening.start();
        window.example("drying-cabinet");
        Thread.sleep(1500);
        List<Double> longest = new ArrayList<>(blocks);
        longest.sort(Collections.reverseOrder());
        System.out.printf(
                Locale.ROOT,
                "longest blocks of the first opening, ms of processor: %s%n",
                longest.subList(0, Math.min(SHOWN, longest.size())).stream()
                        .map(ms -> String.format(Locale.ROOT, "%.0f", ms))
                        .toList());
        System.exit(0);
    }

    /** One question at a time, so that what lies between two answers is one block, or several short ones. */
    private static void listen(List<Double> blocks) {
        ThreadMXBean threads = ManagementFactory.getThreadMXBean();
        Semaphore answered = new Semaphore(0);
        long[] last = {-1};
        while (true) {
            Platform.runLater(() -> {
                long now = threads.getCurrentThreadCpuTime();
                if (last[0] >= 0) {
                    blocks.add((now - last[0]) / 1e6);
                }
                last[0] = now;
                answered.release();
            });
            answered.acquireUninterruptibly();
        }
    }
}
