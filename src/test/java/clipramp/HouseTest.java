package clipramp;

import static com.tngtech.archunit.core.domain.JavaCall.Predicates.target;
import static com.tngtech.archunit.core.domain.JavaClass.Predicates.resideInAnyPackage;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.classes;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.fields;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.noClasses;
import static com.tngtech.archunit.library.GeneralCodingRules.ACCESS_STANDARD_STREAMS;
import static com.tngtech.archunit.library.dependencies.SlicesRuleDefinition.slices;
import static org.assertj.core.api.Assertions.assertThat;

import com.tngtech.archunit.base.DescribedPredicate;
import com.tngtech.archunit.core.domain.AccessTarget.CodeUnitCallTarget;
import com.tngtech.archunit.core.domain.JavaClasses;
import com.tngtech.archunit.core.domain.JavaField;
import com.tngtech.archunit.core.domain.JavaModifier;
import com.tngtech.archunit.core.importer.ClassFileImporter;
import com.tngtech.archunit.core.importer.Location;
import com.tngtech.archunit.lang.ArchCondition;
import com.tngtech.archunit.lang.ConditionEvents;
import com.tngtech.archunit.lang.SimpleConditionEvent;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Set;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** The rules that DEVELOPERS.md gives for the rooms, each with its because. */
class HouseTest {
    /** Every room, the ones that may be looked at from below first; cli and desk stand side by side at the end. */
    private static final List<String> ROOMS = List.of(
            "units", "runs", "circuit", "engine", "firing", "gate", "power", "margins", "faults", "spread", "sizing",
            "fit", "files", "figures", "record", "cli", "desk");

    private static final String[] BELOW_THE_EDGES = ROOMS.stream()
            .filter(room -> !room.equals("cli") && !room.equals("desk"))
            .map(HouseTest::packageOf)
            .toArray(String[]::new);

    private static final JavaClasses HOUSE =
            new ClassFileImporter().withImportOption(HouseTest::isMainCode).importPackages("clipramp");

    /** Tests may look anywhere. Told by the source tree, so that it holds wherever classes are compiled to. */
    private static boolean isMainCode(Location location) {
        String path = location.asURI().toString();
        int start = path.lastIndexOf("/clipramp/");
        if (start < 0 || !path.endsWith(".class")) {
            return false;
        }
        String name = path.substring(start + 1, path.length() - ".class".length());
        int inner = name.indexOf('$');
        return Files.exists(Path.of("src", "main", "java", (inner < 0 ? name : name.substring(0, inner)) + ".java"));
    }

    private static String packageOf(String room) {
        return "clipramp." + room + "..";
    }

    static Stream<String> rooms() {
        return ROOMS.stream();
    }

    @Test
    void hasClassesToJudge() {
        assertThat(HOUSE.size()).isGreaterThan(30);
    }

    @Test
    void everyClassStandsInARoomOfTheList() {
        classes()
                .should()
                .resideInAnyPackage(Stream.concat(Stream.of("clipramp"), rooms().map(HouseTest::packageOf))
                        .toArray(String[]::new))
                .because("a new room needs its one clear sentence in DEVELOPERS.md and its place in the order of rooms")
                .check(HOUSE);
    }

    @ParameterizedTest
    @MethodSource("rooms")
    void roomLooksOnlyAtTheRoomsAboveIt(String room) {
        String[] below = Stream.concat(
                        Stream.of("clipramp"),
                        ROOMS.subList(ROOMS.indexOf(room) + 1, ROOMS.size()).stream()
                                .map(HouseTest::packageOf))
                .toArray(String[]::new);
        noClasses()
                .that()
                .resideInAPackage(packageOf(room))
                .should()
                .dependOnClassesThat()
                .resideInAnyPackage(below)
                .because("each room imports only rooms above it, so that what is physics can be read, tested and reused"
                        + " without what shows it")
                .allowEmptyShould(true)
                .check(HOUSE);
    }

    @Test
    void roomsHaveNoCycles() {
        slices().matching("clipramp.(*)..")
                .should()
                .beFreeOfCycles()
                .because("two rooms that need each other are one room with a wall through it")
                .check(HOUSE);
    }

    @Test
    void commandLineAndWindowNeverMeet() {
        noClasses()
                .that()
                .resideInAPackage("clipramp.desk..")
                .should()
                .dependOnClassesThat()
                .resideInAPackage("clipramp.cli..")
                .orShould()
                .dependOnClassesThat(resideInAnyPackage("picocli.."))
                .because("what both need belongs in a room above both, or one of them computes something of its own")
                .allowEmptyShould(true)
                .check(HOUSE);
        noClasses()
                .that()
                .resideInAPackage("clipramp.cli..")
                .should()
                .dependOnClassesThat()
                .resideInAPackage("clipramp.desk..")
                .because("the command line must run where there is no display; Main alone chooses between the two")
                .allowEmptyShould(true)
                .check(HOUSE);
    }

    @Test
    void javaFxStaysOnTheDesk() {
        noClasses()
                .that()
                .resideOutsideOfPackage("clipramp.desk..")
                .should()
                .dependOnClassesThat()
                .resideInAnyPackage("javafx..", "com.sun.javafx..", "org.jfree.fx..")
                .because("only the window may need a graphics toolkit; everything else must run without one")
                .check(HOUSE);
    }

    @Test
    void awtStaysInFiguresAndRecord() {
        noClasses()
                .that()
                .resideOutsideOfPackages("clipramp.figures..", "clipramp.record..")
                .should()
                .dependOnClassesThat()
                .resideInAnyPackage("java.awt..", "javax.swing..", "javax.imageio..", "sun.awt..")
                .because("drawing is done once, in figures, for every surface")
                .check(HOUSE);
    }

    @Test
    void onlyTheCommandLineSpeaksToTheTerminal() {
        noClasses()
                .that()
                .resideOutsideOfPackage("clipramp.cli..")
                .and()
                .doNotHaveFullyQualifiedName("clipramp.Main")
                .should(ACCESS_STANDARD_STREAMS)
                .because(
                        "answers go to standard output and complaints to standard error in one place, and no stack trace"
                                + " reaches a user")
                .check(HOUSE);
    }

    @Test
    void belowTheEdgesNothingDependsOnTheMachinesLocaleOrCharset() {
        noClasses()
                .that()
                .resideInAnyPackage(BELOW_THE_EDGES)
                .should()
                .callCodeUnitWhere(target(isOneOf(
                        "the default locale or charset",
                        "java.util.Locale.getDefault(",
                        "java.lang.String.format(java.lang.String, [Ljava.lang.Object;)",
                        "java.lang.String.formatted(",
                        "java.lang.String.toLowerCase()",
                        "java.lang.String.toUpperCase()",
                        "java.lang.String.getBytes()",
                        "java.lang.String.<init>([B)",
                        "java.io.PrintStream.printf(java.lang.String",
                        "java.io.PrintWriter.printf(java.lang.String",
                        "java.io.FileReader.<init>(java.lang.String)",
                        "java.io.FileReader.<init>(java.io.File)",
                        "java.io.FileWriter.<init>(java.lang.String)",
                        "java.io.FileWriter.<init>(java.io.File)",
                        "java.io.InputStreamReader.<init>(java.io.InputStream)",
                        "java.io.OutputStreamWriter.<init>(java.io.OutputStream)",
                        "java.nio.charset.Charset.defaultCharset(",
                        "java.text.NumberFormat.getInstance()",
                        "java.text.DecimalFormat.<init>(java.lang.String)",
                        "java.text.SimpleDateFormat.<init>(java.lang.String)",
                        "java.util.Formatter.<init>()",
                        "java.util.Scanner.<init>(java.io.InputStream)")))
                .because(
                        "the same design must give the same text on every machine: Locale.ROOT and UTF-8, always named")
                .check(HOUSE);
    }

    @Test
    void belowTheEdgesNothingReadsTheClockOrAnUnseededRandomSource() {
        noClasses()
                .that()
                .resideInAnyPackage(BELOW_THE_EDGES)
                .should()
                .callCodeUnitWhere(target(isOneOf(
                        "a clock or an unseeded random source",
                        "java.lang.System.currentTimeMillis(",
                        "java.lang.System.nanoTime(",
                        "java.time.Instant.now(",
                        "java.time.LocalDate.now(",
                        "java.time.LocalDateTime.now(",
                        "java.time.LocalTime.now(",
                        "java.time.ZonedDateTime.now(",
                        "java.time.OffsetDateTime.now(",
                        "java.time.Year.now(",
                        "java.time.Clock.system",
                        "java.time.ZoneId.systemDefault(",
                        "java.util.Date.<init>()",
                        "java.util.Calendar.getInstance(",
                        "java.util.GregorianCalendar.<init>()",
                        "java.lang.Math.random(",
                        "java.util.Random.<init>()",
                        "java.util.SplittableRandom.<init>()",
                        "java.util.concurrent.ThreadLocalRandom.current(",
                        "java.security.SecureRandom.<init>(",
                        "java.util.UUID.randomUUID(",
                        "java.util.Collections.shuffle(java.util.List)",
                        "org.apache.commons.math3.random.Well19937c.<init>()",
                        "org.apache.commons.math3.random.MersenneTwister.<init>()",
                        "org.apache.commons.math3.random.JDKRandomGenerator.<init>()",
                        "org.apache.commons.math3.random.RandomDataGenerator.<init>()")))
                .because(
                        "the same design must give the same answer every day: seeds and dates come in through the door")
                .check(HOUSE);
    }

    @Test
    void nothingIsRememberedInStatics() {
        fields().should(new ArchCondition<JavaField>("not be mutable statics") {
                    @Override
                    public void check(JavaField field, ConditionEvents events) {
                        if (isMutableStatic(field)) {
                            events.add(
                                    SimpleConditionEvent.violated(field, field.getFullName() + " is a mutable static"));
                        }
                    }
                })
                .because("two designs solved side by side must not feel each other")
                .check(HOUSE);
    }

    private static boolean isMutableStatic(JavaField field) {
        if (!field.getModifiers().contains(JavaModifier.STATIC)
                || field.getModifiers().contains(JavaModifier.SYNTHETIC)
                || field.getName().startsWith("$")) {
            return false;
        }
        String type = field.getRawType().getName();
        boolean open = field.getRawType().isArray() && !field.getModifiers().contains(JavaModifier.PRIVATE);
        return !field.getModifiers().contains(JavaModifier.FINAL)
                || open
                || type.startsWith("java.util.concurrent.atomic.")
                || Set.of(
                                "java.util.ArrayList",
                                "java.util.HashMap",
                                "java.util.HashSet",
                                "java.util.LinkedHashMap",
                                "java.util.TreeMap",
                                "java.util.EnumMap",
                                "java.util.concurrent.ConcurrentHashMap",
                                "java.util.Random",
                                "java.text.DecimalFormat",
                                "java.text.SimpleDateFormat",
                                "java.lang.StringBuilder",
                                "java.lang.ThreadLocal")
                        .contains(type);
    }

    /** Calls whose full name with parameter types begins as one of these does. */
    private static DescribedPredicate<CodeUnitCallTarget> isOneOf(String what, String... beginnings) {
        return DescribedPredicate.describe(
                what, call -> Stream.of(beginnings).anyMatch(call.getFullName()::startsWith));
    }
}
