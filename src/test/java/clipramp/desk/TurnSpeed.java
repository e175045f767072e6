package clipramp.desk;

import com.sun.javafx.tk.RenderJob;
import com.sun.javafx.tk.Toolkit;
import java.io.IOException;
import java.lang.management.ManagementFactory;
import java.lang.management.ThreadInfo;
import java.lang.management.ThreadMXBean;
import java.nio.file.Files;
import java.util.Arrays;
import java.util.Locale;
import java.util.Map;
import java.util.TreeMap;
import java.util.concurrent.CountDownLatch;
import java.util.concurrent.atomic.AtomicLong;
import javafx.application.Platform;
import javafx.scene.Scene;

/**
 * From a turn of the knob to the painted frame, and how long the window's thread is ever busy: {@code TurnSpeed [TURNS]}.
 * A frame counts as painted when the renderer has done everything that was handed to it.
 */
public final class TurnSpeed {
    private static final int WARMING = 120;

    private TurnSpeed() {}

    public static void main(String[] arguments) throws IOException, InterruptedException {
        int turns = arguments.length > 0 ? Integer.parseInt(arguments[0]) : 500;
        Harness window = Harness.start(Files.createTempDirectory("turns")).example("drying-cabinet");
        double[] millis = new double[turns];
        Map<String, Long> before = Map.of();
        for (int i = -WARMING; i < turns; i++) {
            double took = turn(window, 0.05 + 0.9 * ((i * 37 + 10_000) % 101) / 101);
            if (i >= 0) {
                millis[i] = took;
            } else {
                before = processorTime();
            }
        }
        processorTime(turns, before);
        Arrays.sort(millis);
        System.out.printf(
                Locale.ROOT,
                "%d turns: median %.1f ms, 99 %% %.1f ms, longest %.1f ms%n",
                turns,
                millis[turns / 2],
                millis[turns * 99 / 100],
                millis[turns - 1]);
        System.exit(0);
    }

    private static Map<String, Long> processorTime() {
        ThreadMXBean threads = ManagementFactory.getThreadMXBean();
        Map<String, Long> times = new TreeMap<>();
        for (long id : threads.getAllThreadIds()) {
            ThreadInfo info = threads.getThreadInfo(id);
            if (info != null) {
                times.merge(info.getThreadName(), threads.getThreadCpuTime(id), Long::sum);
            }
        }
        return times;
    }

    /** What each thread computes a turn: a figure that other work on the machine moves little. */
    private static void processorTime(int turns, Map<String, Long> before) {
        processorTime().forEach((name, nanos) -> {
            double millis = (nanos - before.getOrDefault(name, 0L)) / 1e6 / turns;
            if (millis > 0.05) {
                System.out.printf(Locale.ROOT, "  %s: %.2f ms of processor a turn%n", name, millis);
            }
        });
    }

    private static double turn(Harness window, double position) throws InterruptedException {
        CountDownLatch painted = new CountDownLatch(1);
        AtomicLong end = new AtomicLong();
        long start = System.nanoTime();
        Platform.runLater(() -> {
            Scene scene = window.stage.getScene();
            Runnable[] after = new Runnable[1];
            after[0] = () -> {
                boolean there = window.model
                                        .bench()
                                        .reading()
                                        .orElseThrow()
                                        .point()
                                        .position()
                                        .orElse(-1)
                                == position
                        && ((FigurePane) scene.lookup("#lanes")).isPainted()
                        && ((FigurePane) scene.lookup("#knob-curve")).isPainted();
                if (there) {
                    scene.removePostLayoutPulseListener(after[0]);
                    // Behind this pulse's own rendering in the renderer's queue.
                    Platform.runLater(() -> Toolkit.getToolkit().addRenderJob(new RenderJob(() -> {
                        end.set(System.nanoTime());
                        painted.countDown();
                    })));
                }
            };
            scene.addPostLayoutPulseListener(after[0]);
            window.model.bench().turnTo(position);
        });
        painted.await();
        return (end.get() - start) / 1e6;
    }
}
