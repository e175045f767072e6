package clipramp.desk;

import clipramp.OwnClassPath;
import clipramp.desk.model.Places;
import clipramp.desk.model.Recovery;
import java.io.BufferedReader;
import java.io.IOException;
import java.io.InputStreamReader;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Random;

/**
 * Kills a window in the middle of its edits, again and again, and looks whether the work can be taken back:
 * {@code Kills TIMES [SEED]}.
 */
public final class Kills {
    private static final String EDITED = "edited ";
    private static final List<String> HEADLESS =
            List.of("glass.platform", "monocle.platform", "prism.order", "java.awt.headless", "headless.geometry");

    private Kills() {}

    public static void main(String[] arguments) throws IOException, InterruptedException {
        int times = Integer.parseInt(arguments[0]);
        long seed = arguments.length > 1 ? Long.parseLong(arguments[1]) : 1;
        int kept = kill(times, seed);
        System.out.println(kept + " of " + times + " kills left the work to be taken back (seed " + seed + ")");
    }

    /** How many of so many kills left work that holds the last edit that was told of. */
    static int kill(int times, long seed) throws IOException, InterruptedException {
        Random random = new Random(seed);
        int kept = 0;
        for (int i = 0; i < times; i++) {
            Path home = Files.createTempDirectory("kills");
            kept += survives(home, 3 + random.nextInt(12), random.nextInt(25)) ? 1 : 0;
        }
        return kept;
    }

    private static boolean survives(Path home, int edits, int delayMillis) throws IOException, InterruptedException {
        List<String> command = new ArrayList<>(
                List.of(Path.of(System.getProperty("java.home"), "bin", "java").toString(), "-XX:TieredStopAtLevel=1"));
        for (String name : HEADLESS) {
            command.add("-D" + name + "=" + System.getProperty(name));
        }
        command.addAll(List.of("-cp", OwnClassPath.text(), Editor.class.getName(), home.toString()));
        Process process = new ProcessBuilder(command).redirectErrorStream(true).start();
        long last = 0;
        try (BufferedReader out =
                new BufferedReader(new InputStreamReader(process.getInputStream(), StandardCharsets.UTF_8))) {
            String line = out.readLine();
            while (line != null && last < edits) {
                last = line.startsWith(EDITED) ? Long.parseLong(line.substring(EDITED.length())) : last;
                line = last < edits ? out.readLine() : line;
            }
            Thread.sleep(delayMillis);
            process.destroyForcibly().waitFor();
        }
        Places places = new Places(home.resolve("config"), home.resolve("state"));
        List<Recovery.Left> left = new Recovery(places, ProcessHandle.current(), 0).leftBehind();
        if (last < edits || left.size() != 1) {
            return false;
        }
        String text = left.get(0).text();
        int from = text.indexOf("title: ") + "title: edit ".length();
        return Long.parseLong(text.substring(from, text.indexOf('\n', from))) >= last;
    }

    /** The window that is killed: it edits the title without end, and tells of every edit that was taken. */
    public static final class Editor {
        private Editor() {}

        public static void main(String[] arguments) {
            Harness window = Harness.start(Path.of(arguments[0])).example("drying-cabinet");
            for (int i = 1; ; i++) {
                String title = "edit " + i;
                Harness.at(() -> {
                    window.model.draft().set("title", "title", title, trouble -> {});
                    return null;
                });
                window.await(() -> window.model
                        .draft()
                        .sheet()
                        .orElseThrow()
                        .design()
                        .title()
                        .equals(title));
                System.out.println(EDITED + i);
            }
        }
    }
}
