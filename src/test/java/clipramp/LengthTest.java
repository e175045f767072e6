package clipramp;

import static java.util.Map.entry;
import static org.assertj.core.api.Assertions.assertThat;

import com.sun.source.tree.BlockTree;
import com.sun.source.tree.ClassTree;
import com.sun.source.tree.CompilationUnitTree;
import com.sun.source.tree.MethodTree;
import com.sun.source.util.JavacTask;
import com.sun.source.util.SourcePositions;
import com.sun.source.util.TreeScanner;
import com.sun.source.util.Trees;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.TreeMap;
import java.util.stream.Stream;
import javax.tools.JavaCompiler;
import javax.tools.StandardJavaFileManager;
import javax.tools.ToolProvider;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestInstance;

/** How long a file and a method may be, and each that is longer with its reason. Lines as the formatter lays them. */
@TestInstance(TestInstance.Lifecycle.PER_CLASS)
class LengthTest {
    private static final Path MAIN = Path.of("src", "main", "java", "clipramp");
    private static final int MOST_FILE_LINES = 300;
    private static final int MOST_BODY_LINES = 30;

    private static final String TABLE = "a table, one entry after the other";
    private static final String KERNEL = "a hot kernel, kept together for the compiler";
    private static final String LAID_OUT = "short, but for one argument a line";
    private static final String PAGE = "a page's controls, dressed in the order in which they are read";

    private static final Map<String, String> LONG_FILES = Map.ofEntries(
            entry("margins/MarginKind", TABLE),
            entry("files/DesignKeys", TABLE),
            entry("files/DeviceKeys", TABLE),
            entry("engine/Piece", "one piece's solution and all that can be read from it, in one object for speed"),
            entry("engine/Stepper", "one state machine; its forms, laws and searches already stand apart"),
            entry("engine/SwiftStepper", KERNEL),
            entry("engine/SwiftPiece", KERNEL),
            entry("firing/SwiftFiring", KERNEL),
            entry("power/InductiveRun", "one state machine; every part moves the same few fields"),
            entry("desk/WindowActions", "what the window can be asked, mostly a line each"),
            entry("files/Scope", "one reader for each kind of value that a key can hold"),
            entry("sizing/Reasons", "a sentence for each part"));

    private static final Map<String, String> LONG_METHODS = Map.ofEntries(
            entry("files/DeviceKeys.unijunction", TABLE),
            entry("files/DeviceKeys.thyristor", TABLE),
            entry("files/DesignKeys.gate", TABLE),
            entry("files/DesignKeys.rest", TABLE),
            entry("files/DesignKeys.stage", TABLE),
            entry("files/DesignKeys.ramp", TABLE),
            entry("files/DesignKeys.line", TABLE),
            entry("sizing/Moves.next", TABLE),
            entry("firing/SwiftFiring.settlesQuickly", KERNEL),
            entry("engine/SwiftPiece.seek", KERNEL),
            entry("engine/SwiftProof.staysUnder", KERNEL),
            entry("engine/SwiftLaws.work", KERNEL),
            entry(
                    "engine/TransformerLaws.nodes",
                    "two equations with two unknowns, written out coefficient by coefficient"),
            entry("engine/UnitValues.<init>", "every final field is assigned here or nowhere"),
            entry("sizing/Trimming.low", "three nested choices that share what was found best"),
            entry("files/DesignReader.read", LAID_OUT),
            entry("files/TriggerSection.unijunction", LAID_OUT),
            entry("desk/model/NewDesign.request", "a design file as text"),
            entry("desk/DeskWindow.<init>", PAGE),
            entry("desk/NewPage.<init>", PAGE),
            entry("desk/SpreadPage.ask", PAGE),
            entry("firing/HalfCycleRun.next", "one loop over the events of a half cycle"),
            entry("spread/Spread.run", LAID_OUT),
            entry("desk/LinePage.<init>", PAGE),
            entry("desk/ProposalPage.<init>", PAGE),
            entry("desk/ReadoutView.<init>", PAGE),
            entry("desk/HeaderView.<init>", PAGE));

    private final Map<String, Integer> fileLines = new TreeMap<>();
    private final Map<String, Integer> bodyLines = new TreeMap<>();

    LengthTest() throws IOException {
        List<Path> sources;
        try (Stream<Path> paths = Files.walk(MAIN)) {
            sources = paths.filter(path -> path.toString().endsWith(".java")).toList();
        }
        JavaCompiler compiler = ToolProvider.getSystemJavaCompiler();
        try (StandardJavaFileManager files =
                compiler.getStandardFileManager(null, Locale.ROOT, StandardCharsets.UTF_8)) {
            JavacTask task = (JavacTask)
                    compiler.getTask(null, files, null, null, null, files.getJavaFileObjectsFromPaths(sources));
            SourcePositions positions = Trees.instance(task).getSourcePositions();
            for (CompilationUnitTree file : task.parse()) {
                measure(file, positions);
            }
        }
    }

    private void measure(CompilationUnitTree file, SourcePositions positions) throws IOException {
        Path path = Path.of(file.getSourceFile().toUri());
        String name = MAIN.toAbsolutePath().relativize(path).toString().replace('\\', '/');
        String unit = name.substring(0, name.length() - ".java".length());
        fileLines.put(unit, Files.readAllLines(path).size());
        new TreeScanner<Void, String>() {
            @Override
            public Void visitClass(ClassTree type, String outer) {
                boolean top = unit.endsWith("/" + type.getSimpleName()) || unit.contentEquals(type.getSimpleName());
                return super.visitClass(type, top ? outer : outer + "." + type.getSimpleName());
            }

            @Override
            public Void visitMethod(MethodTree method, String owner) {
                BlockTree body = method.getBody();
                if (body != null) {
                    long from = file.getLineMap().getLineNumber(positions.getStartPosition(file, body));
                    long to = file.getLineMap().getLineNumber(positions.getEndPosition(file, body));
                    bodyLines.merge(owner + "." + method.getName(), (int) (to - from - 1), Math::max);
                }
                return super.visitMethod(method, owner);
            }
        }.scan(file, unit);
    }

    @Test
    void everyFileFitsOnAFewScreensOrSaysWhyNot() {
        assertThat(longer(fileLines, MOST_FILE_LINES))
                .as("files over %d lines: a new one needs its reason, a mended one leaves the list", MOST_FILE_LINES)
                .containsExactlyInAnyOrderElementsOf(LONG_FILES.keySet());
    }

    @Test
    void everyMethodFitsOnAScreenOrSaysWhyNot() {
        assertThat(longer(bodyLines, MOST_BODY_LINES))
                .as("bodies over %d lines: a new one needs its reason, a mended one leaves the list", MOST_BODY_LINES)
                .containsExactlyInAnyOrderElementsOf(LONG_METHODS.keySet());
    }

    private static List<String> longer(Map<String, Integer> lines, int most) {
        return lines.entrySet().stream()
                .filter(measured -> measured.getValue() > most)
                .map(Map.Entry::getKey)
                .toList();
    }
}
