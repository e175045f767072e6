package clipramp.files;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.catchThrowableOfType;

import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** Mistakes made by hand, one at a time: each is told at its place, with what was read and what to do. */
class BadInputTest {
    private static final ProfileLibrary SHIPPED = ProfileLibrary.shipped();

    static String base() {
        try {
            return Files.readString(Path.of("src/test/resources/clipramp/files/wax-melter.yaml"));
        } catch (IOException e) {
            throw new java.io.UncheckedIOException(e);
        }
    }

    /**
     * @param find what stands in the good file
     * @param mistake what is written in its place; ¦ marks where the problem must be told
     * @param path the key that is named
     * @param says what the message contains
     */
    record Mistake(String find, String mistake, String path, String... says) {
        @Override
        public String toString() {
            return mistake;
        }
    }

    static Stream<Mistake> mistakes() {
        return Stream.of(
                new Mistake(
                        "{ramp.capacitor: C3}",
                        "{ramp.capacitor: C3, clip.dropper: ¦C3}",
                        "designators.clip.dropper",
                        "names another part already"),
                new Mistake(
                        "10 kΩ ±5 % 12 W",
                        "¦10 mohm",
                        "clip.dropper",
                        "read \"10 mohm\" (0.010 Ω); expected 100 Ω..1 MΩ. 10 Mohm or 10 kohm?"),
                new Mistake(
                        "capacitor: 100 nF",
                        "¦capacitator: 100 nF",
                        "ramp.capacitator",
                        "unknown key. Nearest: capacitor."),
                new Mistake("100 nF ±10 %", "¦104", "ramp.capacitor", "104 is 100 nF: write that."),
                new Mistake(
                        "100 nF ±10 %",
                        "¦100", "ramp.capacitor", "As a marking 100 is 10 pF: write that, or 100 with its unit."),
                new Mistake("100 nF ±10 %", "¦0,1 uF", "ramp.capacitor", "Decimals take a dot", "0.1 uF?"),
                new Mistake("100 nF ±10 %", "¦100 NF", "ramp.capacitor", "100 nF?"),
                new Mistake("100 nF ±10 %", "¦2n2F", "ramp.capacitor", "farad or 1 %"),
                new Mistake("100 nF ±10 %", "¦1_000 nF", "ramp.capacitor", "underscore"),
                new Mistake("4.7 kΩ ±5 %", "¦1 meg", "ramp.fixed", "Mega is M: 1 Mohm?"),
                new Mistake("4.7 kΩ ±5 %", "¦4.7 kV", "ramp.fixed", "is a voltage"),
                new Mistake("4.7 kΩ ±5 %", "¦4.7 kΩ ±5", "ramp.fixed", "±5 %?"),
                new Mistake("4.7 kΩ ±5 %", "¦4.7 kΩ ±5 % ±1 %", "ramp.fixed", "stands twice"),
                new Mistake("4.7 kΩ ±5 %", "¦[4.7 kΩ]", "ramp.fixed", "read a list", "0 Ω..100 MΩ"),
                new Mistake("4.7 kΩ ±5 %", "¦{value: 4}", "ramp.fixed", "read a mapping"),
                new Mistake("100 kΩ ±20 %", "¦1,000 k", "ramp.pot.track", "read \"1,000 k\"", "dot"),
                new Mistake(
                        "clipramp: 1", "clipramp: ¦2", "clipramp", "format version 2", "newer", "Get a newer clipramp"),
                new Mistake("clipramp: 1", "clipramp: ¦one", "clipramp", "expected 1"),
                new Mistake("clipramp: 1\ntitle", "title", "clipramp", "is missing"),
                new Mistake("voltage: 230 V, freq", "voltage: ¦230 W, freq", "line.voltage", "is a power"),
                new Mistake(
                        "voltage: 230 V, freq",
                        "voltage: ¦230 kV, freq",
                        "line.voltage",
                        "(230000 V)",
                        "5 V..1 kV",
                        "230 V?"),
                new Mistake("low: -10 %", "low: ¦10 %", "line.low", "-10 %?"),
                new Mistake("high: +10 %", "high: ¦253", "line.high", "253 V?"),
                new Mistake("share: 4 %", "share: ¦4", "line.harmonics[0].share", "(400 %)", "4 %?"),
                new Mistake("phase: 0 deg", "phase: ¦0", "line.harmonics[0].phase", "0 deg?"),
                new Mistake("order: 5", "order: ¦1", "line.harmonics[0].order", "2..100"),
                new Mistake("order: 5", "order: ¦2.5", "line.harmonics[0].order", "a whole number"),
                new Mistake("harmonics: [{order: 5", "harmonics: [¦3, {order: 5", "line.harmonics[0]", "braces"),
                new Mistake("[{order: 5, share: 4 %, phase: 0 deg}]", "¦5", "line.harmonics", "expected a list"),
                new Mistake("stage: bridge-dc", "stage: ¦bridge-cd", "stage", "bridge-dc", "Nearest: bridge-dc."),
                new Mistake("kind: inductive", "kind: ¦motor", "load.kind", "resistor | inductive | filament"),
                new Mistake(
                        "inductance: 120 mH, ",
                        "inductance: 120 mH, ¦rated: 700 W, ",
                        "load.rated",
                        "no place with kind inductive"),
                new Mistake(
                        "load: {kind: inductive, resistance: 40 ohm, inductance: 120 mH, freewheel: {drop: 0.9 V, slope: 10 mohm}}",
                        "load: ¦{kind: resistor}",
                        "load",
                        "exactly one of rated and resistance"),
                new Mistake(
                        "load: {kind: inductive, resistance: 40 ohm, inductance: 120 mH, freewheel: {drop: 0.9 V, slope: 10 mohm}}",
                        "load: ¦{kind: resistor, rated: 700 W, resistance: 40 ohm}",
                        "load",
                        "keep exactly one"),
                new Mistake(
                        "load: {kind: inductive, resistance: 40 ohm, inductance: 120 mH, freewheel: {drop: 0.9 V, slope: 10 mohm}}",
                        "load: {kind: resistor, rated: ¦700 V}",
                        "load.rated",
                        "is a voltage"),
                new Mistake(
                        "load: {kind: inductive, resistance: 40 ohm, inductance: 120 mH, freewheel: {drop: 0.9 V, slope: 10 mohm}}",
                        "load: {kind: resistor, rated: ¦700 W at 230 W}",
                        "load.rated",
                        "is a power"),
                new Mistake(
                        "kind: inductive, resistance: 40 ohm, inductance: 120 mH, freewheel: {drop: 0.9 V, slope: 10 mohm}",
                        "kind: ¦inductive, resistance: 40 ohm, inductance: 120 mH",
                        "load.kind",
                        "inductive with stage bridge-dc",
                        "load.freewheel"),
                new Mistake("tap: line", "tap: ¦lines", "clip.tap", "line | thyristor", "Nearest: line."),
                new Mistake(
                        "rectifier: bridge",
                        "rectifier: ¦diode",
                        "clip.rectifier",
                        "diode with stage bridge-dc",
                        "Use bridge."),
                new Mistake(
                        "  winding: none",
                        "  winding: ¦winding-240v",
                        "clip.winding",
                        "no winding profile",
                        "winding-230v-24v"),
                new Mistake(
                        "max: 21 V}, test-current",
                        "max: 18 V}, test-current",
                        "clip.zener.voltage",
                        "out of order",
                        "min 19 V"),
                new Mistake(
                        "max: 21 V}, test-current",
                        "¦maximum: 21 V}, test-current",
                        "clip.zener.voltage.maximum",
                        "unknown key. Nearest: max."),
                new Mistake(
                        "zener: {voltage",
                        "zener: {kind: ¦scr}\n  xener: {voltage",
                        "clip.zener.kind",
                        "no such kind here"),
                new Mistake("drift: 0.09 %/K", "drift: ¦0.09", "clip.zener.drift", "0.09 %/K?"),
                new Mistake("law: table", "law: ¦lin", "ramp.pot.law", "Nearest: linear."),
                new Mistake(
                        "law: table, points: [[0 %, 0 %], [50 %, 15 %], [100 %, 100 %]]",
                        "law: log, half: ¦50 %", "ramp.pot.half", "1 %..49 %"),
                new Mistake("law: table, ", "law: linear, ¦", "ramp.pot.points", "no place with law linear"),
                new Mistake(
                        "points: [[0 %, 0 %], [50 %, 15 %]",
                        "points: [[0 %, 0 %], ¦50 %", "ramp.pot.points[1]", "a pair"),
                new Mistake(
                        "[[0 %, 0 %], [50 %, 15 %], [100 %, 100 %]]",
                        "¦[[0 %, 0 %], [50 %, 15 %], [99 %, 100 %]]", "ramp.pot.points", "rotation 100 %"),
                new Mistake("[50 %, 15 %]", "[50 %, ¦15]", "ramp.pot.points[1][1]", "15 %?"),
                new Mistake("sense: falling", "sense: ¦clockwise", "ramp.pot.sense", "rising | falling"),
                new Mistake(
                        "    kind: unijunction",
                        "    kind: ¦bjt",
                        "trigger.device.kind",
                        "unijunction, programmable-unijunction"),
                new Mistake(
                        "standoff: {min: 0.56, typ: 0.65, max: 0.75}",
                        "standoff: ¦65",
                        "trigger.device.standoff",
                        "(6500 %)",
                        "65 %?"),
                new Mistake(
                        "    interbase: {min: 4.7 kΩ, typ: 7 kΩ, max: 9.1 kΩ}\n",
                        "    interbase: ¦7 mΩ\n",
                        "trigger.device.interbase",
                        "7 MΩ or 7 kΩ?"),
                new Mistake(
                        "voltage: 2 V, at: 20 V",
                        "voltage: 2 V, ¦hat: 20 V",
                        "trigger.device.valley.hat",
                        "Nearest: at."),
                new Mistake(
                        "    saturation: {voltage: 3.5 V, current: 50 mA, at: 10 V}\n",
                        "",
                        "trigger.device.saturation",
                        "is missing",
                        "{voltage, current, at}"),
                new Mistake("  base-two: 470 Ω ±5 %", "  ¦upper: 470 Ω ±5 %", "trigger.upper", "base-two"),
                new Mistake("coupling: transformer", "coupling: ¦directly", "gate.coupling", "Nearest: direct."),
                new Mistake("overdrive: 3", "overdrive: ¦0.5", "gate.overdrive", "1..100"),
                new Mistake("overdrive: 3", "overdrive: ¦0x3", "gate.overdrive", "decimal digits"),
                new Mistake("charge-time: 20 us", "charge-time: ¦20", "gate.charge-time", "(20 s)", "20 us"),
                new Mistake("ratio: 2:1", "ratio: ¦2:x", "gate.transformer.ratio", "begin with a number"),
                new Mistake("secondaries: 1", "secondaries: ¦3", "gate.transformer.secondaries", "1..2"),
                new Mistake(
                        "secondaries: 1",
                        "secondaries: ¦2",
                        "gate.transformer.secondaries",
                        "2 with stage bridge-dc",
                        "Use 1."),
                new Mistake("polarity: positive", "polarity: ¦negative", "gate.polarity", "Use positive."),
                new Mistake("stage: bridge-dc", "stage: triac", "thyristor.device", "scr with stage triac"),
                new Mistake(
                        "  coupling: transformer",
                        "  coupling: direct\n  ¦x-transformer: 1",
                        "gate.x-transformer",
                        "Nearest: transformer."),
                new Mistake(
                        "{at: -40 degC, current: 60 mA",
                        "{at: ¦25 degC, current: 60 mA",
                        "thyristor.device.gate.trigger[1].at",
                        "stands twice"),
                new Mistake(
                        "latching: [{at: 25 degC, current: 90 mA}, {at: -40 degC, current: 180 mA}]",
                        "latching: ¦[]",
                        "thyristor.device.latching",
                        "empty"),
                new Mistake(
                        "non-trigger: {voltage: 0.2 V, at: 125 degC}",
                        "non-trigger: {voltage: 0.2 V, at: ¦125 K}",
                        "thyristor.device.gate.non-trigger.at",
                        "125 degC?"),
                new Mistake("i2t: 40 A²s", "i2t: ¦40 A", "thyristor.device.limits.i2t", "is a current"),
                new Mistake(
                        "coldest: 0 degC",
                        "coldest: ¦60 degC",
                        "surroundings.coldest",
                        "above surroundings.hottest",
                        "Exchange them?"),
                new Mistake("coldest: 0 degC", "coldest: ¦32 degF", "surroundings.coldest", "0 degC?"),
                new Mistake(
                        "coldest: 0 degC",
                        "coldest: ¦0,5 degC",
                        "surroundings.coldest",
                        "decimals take a dot: 0.5 degC?"),
                new Mistake(
                        "lowest: 2 %..5 % at 0 %",
                        "lowest: ¦5 %..2 % at 0 %", "wanted.lowest", "from low to high", "2 %..5 %?"),
                new Mistake("lowest: 2 %..5 % at 0 %", "lowest: ¦5 %", "wanted.lowest", "5 % at 0 %?"),
                new Mistake("lowest: 2 %..5 % at 0 %", "lowest: ¦5 A at 0 %", "wanted.lowest", "is a current"),
                new Mistake("highest: 95 % at 100 %", "highest: ¦95 % at 100", "wanted.highest", "100 %?"),
                new Mistake("resistors: 50 %", "resistors: ¦50", "derating.resistors", "50 %?"),
                new Mistake(
                        "{ramp.capacitor: C3}",
                        "{¦ramp.condenser: C3}",
                        "designators.ramp.condenser",
                        "no part has this key"),
                new Mistake("date: 2031-02-28", "date: ¦2031-02-29", "document.date", "year-month-day"),
                new Mistake("title: Wax melter, inner ring", "¦title:", "title", "has no value", "Write none"),
                new Mistake("title: Wax melter, inner ring", "title: Wax\n¦title: Melter", "title", "stands twice"),
                new Mistake("title: Wax melter, inner ring", "title: ¦&t Wax", "title", "anchors (&)"),
                new Mistake("title: Wax melter, inner ring", "title: ¦*t", "title", "aliases (*)"),
                new Mistake("title: Wax melter, inner ring", "title: ¦!!str Wax", "title", "tags (!)"),
                new Mistake("title: Wax melter, inner ring", "title: ¦@Wax", "", "cannot begin with this sign"),
                new Mistake("title: Wax melter, inner ring", "title: Wax¦: melter", "", "a second \": \""),
                new Mistake("  tap: line", "¦\ttap: line", "", "a tab stands here"),
                new Mistake("notes: free text", "notes: free¦\u0007 text", "", "control sign (U+0007)"),
                new Mistake(
                        "derating: {resistors: 50 %}", "---\n¦derating: {resistors: 50 %}", "", "a second document"),
                new Mistake(
                        "derating: {resistors: 50 %}", "derating: ¦{resistors: 50 %\n", "", "a brace { is not closed"),
                new Mistake("derating: {resistors: 50 %}", "derating: {¦[a]: 50 %}", "", "a key is one word"),
                new Mistake(
                        "derating: {resistors: 50 %}",
                        "derating: {a: {b: {c: {d: {e: {f: {g: {h: {i: {j: {k: ¦{l: {m: n}}}}}}}}}}}}}",
                        "derating.a.b.c.d.e.f.g.h.i.j.k",
                        "deeper than 12"),
                new Mistake("derating: {resistors: 50 %}", "derating: ¦half", "derating", "{resistors}"),
                new Mistake(
                        "derating: {resistors: 50 %}",
                        "¦colour: red", "colour", "unknown key. Known: clipramp, title"));
    }

    @ParameterizedTest
    @MethodSource("mistakes")
    void isToldAtItsPlaceWithWhatToDo(Mistake mistake) {
        String good = base();
        assertThat(good).contains(mistake.find());
        String marked = good.replace(mistake.find(), mistake.mistake());
        String text = marked.replace("¦", "");
        InvalidInputException e = catchThrowableOfType(
                InvalidInputException.class, () -> DesignFiles.load(new Source("wax.yaml", text), List.of(), SHIPPED));
        assertThat(e).as("refused").isNotNull();
        Problem problem = e.problems().stream()
                .filter(p -> p.path().equals(mistake.path()))
                .findFirst()
                .orElseThrow(() -> new AssertionError(e.getMessage()));
        assertThat(problem.message()).contains(mistake.says());
        assertThat(problem.text()).startsWith("wax.yaml:" + problem.line() + ":" + problem.column() + " ");
        int mark = marked.indexOf('¦');
        if (mark >= 0) {
            int line = (int) marked.substring(0, mark)
                            .chars()
                            .filter(c -> c == '\n')
                            .count()
                    + 1;
            int column = mark - marked.lastIndexOf('\n', mark);
            assertThat(problem.line() + ":" + problem.column())
                    .as(e.getMessage())
                    .isEqualTo(line + ":" + column);
        }
    }

    @Test
    void theGoodFileReads() {
        assertThat(DesignFiles.load(new Source("wax.yaml", base()), List.of(), SHIPPED)
                        .assumed())
                .isEmpty();
    }

    @Test
    void allProblemsAreToldAtOnceInTheOrderOfTheirLines() {
        String text = base().replace("10 kΩ ±5 % 12 W", "10 mohm")
                .replace("capacitor: 100 nF", "capacitator: 100 nF")
                .replace("overdrive: 3", "overdrive: 0.5")
                .replace("coupling: transformer", "coupling: direct")
                .replace("hottest: 50 degC", "hottest: 50");
        InvalidInputException e = catchThrowableOfType(
                InvalidInputException.class, () -> DesignFiles.load(new Source("wax.yaml", text), List.of(), SHIPPED));
        assertThat(e.problems())
                .extracting(Problem::path)
                .containsExactly(
                        "clip.dropper",
                        "ramp.capacitator",
                        "gate.overdrive",
                        "gate.transformer",
                        "surroundings.hottest");
        assertThat(e.getMessage().lines()).hasSize(5);
    }

    @Test
    void aLineTapWithDirectCouplingOnATriacIsRefusedWithItsReason() {
        String text = base().replace("stage: bridge-dc", "stage: triac")
                .replaceAll("(?m)^  coupling: transformer$", "  coupling: direct")
                .replaceAll("(?m)^  transformer: .*\n", "");
        assertThatThrownBy(() -> DesignFiles.load(new Source("dryer.yaml", text), List.of(), SHIPPED))
                .hasMessageContaining("gate.coupling direct with stage triac: the firing common would jump between the"
                        + " line wires. Use transformer, or clip.winding.");
    }

    @Test
    void refusesWhatIsNoTextAtAll() {
        assertThatThrownBy(() -> Source.of("x", new ByteArrayInputStream(new byte[] {'a', '\n', 'b', (byte) 0xff})))
                .isInstanceOf(InvalidInputException.class)
                .hasMessageContaining("x:2:2 the file is not UTF-8 from here on");
        assertThatThrownBy(() -> Source.of("x", new ByteArrayInputStream(new byte[Source.LARGEST_BYTES + 1])))
                .hasMessageContaining("larger than 1 MiB");
        for (String text : List.of("", "# only a comment\n", "- a\n- b\n", "just text", "{}", "[]", "\u0000")) {
            assertThatThrownBy(() -> DesignFiles.load(new Source("x", text), List.of(), SHIPPED))
                    .as(text)
                    .isInstanceOf(InvalidInputException.class);
        }
    }

    @Test
    void aByteOrderMarkIsNoContent() throws IOException {
        byte[] bytes = ("\ufeff" + base()).getBytes(StandardCharsets.UTF_8);
        Source source = Source.of("-", new ByteArrayInputStream(bytes));
        assertThat(DesignFiles.load(source, List.of(), SHIPPED).name()).isEqualTo("-");
    }

    @Test
    void overridesReplaceEverythingAtTheirPath() {
        assertThat(load("trigger.device.standoff=0.6").trigger().toString())
                .contains("standoff=Characteristic[min=OptionalDouble.empty, typ=OptionalDouble[0.6]");
        assertThat(load("ramp.capacitor=220 nF").ramp().capacitor().tolerance().isNone())
                .isTrue();
        assertThat(load("line.harmonics[0].share=3 %").line().harmonics().get(0).share())
                .isEqualTo(0.03);
        assertThat(load("line.harmonics[0]=none").line().harmonics()).isEmpty();
        assertThat(load("ramp.pot=none").ramp().pot()).isEmpty();
        assertThat(load("gate.overdrive=5", "gate.overdrive=4").gate().overdrive())
                .isEqualTo(4);
        assertThat(load("gate.shunt=none").gate().shunt()).isEmpty();
        assertThat(load("wanted=none").wanted().lowest()).isEmpty();
        assertThat(load("clip.zener=zener-18v", "clip.zener.power=2 W")
                        .clip()
                        .zener()
                        .id())
                .isEqualTo("zener-18v, changed");
        assertThat(load("clip.zener={like: zener-18v, voltage: {max: 20 V}}")
                        .clip()
                        .zener()
                        .volts()
                        .min()
                        .getAsDouble())
                .isLessThan(18);
        assertThat(load("line={voltage: 120 V, frequency: 60 Hz}").line().volts())
                .isEqualTo(120);
    }

    private static clipramp.circuit.Design load(String... overrides) {
        return DesignFiles.load(new Source("wax.yaml", base()), List.of(overrides), SHIPPED)
                .design();
    }

    @Test
    void overridesAreRefusedUnderTheirOwnName() {
        Map<String, String> wrong = Map.of(
                "clip.droper=1k", "--with clip.droper: unknown key. Nearest: dropper.",
                "clip.dropper=10 mohm", "--with clip.dropper: read \"10 mohm\" (0.010 Ω)",
                "clip.dropper", "--with clip.dropper: read \"clip.dropper\"; expected key=value",
                "=3", "expected key=value",
                "a..b=3", "--with a..b: is no key",
                "line.harmonics[1].share=4 %", "the list has 1 items",
                "ramp.pot[0]=3", "there is no list here",
                "trigger.device=2n264", "Nearest: 2n2646",
                "wanted={lowest: [", "a brace { or a bracket [",
                "stage.x=3", "--with stage");
        wrong.forEach((override, says) -> assertThatThrownBy(() -> load(override))
                .as(override)
                .isInstanceOf(InvalidInputException.class)
                .hasMessageContaining(says));
    }

    @Test
    void profilesInFoldersHideTheProgramsOwnAndThatIsNoted(@TempDir Path folder) throws IOException {
        Path kind = Files.createDirectories(folder.resolve("zener"));
        String mine = "clipramp: 1\nkind: zener\nid: zener-20v\nvoltage: 20.5 V\ntest-current: 5 mA\nslope: 25 ohm\n";
        Files.writeString(kind.resolve("zener-20v.yaml"), mine);
        Files.writeString(
                kind.resolve("mine.yaml"), "clipramp: 1\nkind: zener\nid: mine\nlike: zener-20v\nslope: 30 ohm\n");
        Files.writeString(kind.resolve("a.yaml"), "clipramp: 1\nkind: zener\nid: a\nlike: b\n");
        Files.writeString(kind.resolve("b.yaml"), "clipramp: 1\nkind: zener\nid: b\nlike: a\n");
        Files.writeString(kind.resolve("wrong.yaml"), "clipramp: 1\nkind: zener\nid: other\n");
        Files.writeString(kind.resolve("broken.yaml"), "clipramp: 1\nkind: zener\nid: broken\nvoltage: 20 A\n");
        ProfileLibrary library = ProfileLibrary.of(List.of(new ProfileLibrary.Folder(folder, "user folder")));
        LoadedDesign loaded = DesignFiles.load(new Source("w", base()), List.of("clip.zener=mine"), library);
        assertThat(loaded.design().clip().zener().slopeOhms()).isEqualTo(30);
        assertThat(loaded.design().clip().zener().volts().nominal()).isEqualTo(20.5);
        assertThat(loaded.profiles()).extracting(LoadedDesign.ProfileUse::id).containsExactly("mine", "zener-20v");
        assertThat(loaded.profiles().get(1).hides()).isEqualTo("program zener-20v");
        assertThat(loaded.profiles().get(1).from()).isEqualTo("user folder");
        assertThat(loaded.notes())
                .contains(
                        "The profile zener-20v comes from: user folder. It hides a different one: program zener-20v.");
        assertThatThrownBy(() -> DesignFiles.load(new Source("w", base()), List.of("clip.zener=a"), library))
                .hasMessageContaining("in a circle: a -> b -> a");
        assertThatThrownBy(() -> DesignFiles.load(new Source("w", base()), List.of("clip.zener=wrong"), library))
                .hasMessageContaining("the profile's id read \"other\"; by its file it is wrong");
        assertThatThrownBy(() -> DesignFiles.load(new Source("w", base()), List.of("clip.zener=broken"), library))
                .hasMessageContaining("broken.yaml:4:10 clip.zener.voltage: read \"20 A\"")
                .hasMessageContaining("clip.zener.slope: is missing");
        assertThat(library.ids("zener")).contains("mine", "zener-20v");
    }

    @Test
    void userFolderFollowsTheEnvironment() {
        Path home = Path.of("/home/someone");
        assertThat(ProfileLibrary.userFolder(Map.of(), home, false))
                .isEqualTo(Path.of("/home/someone/.config/clipramp/profiles"));
        assertThat(ProfileLibrary.userFolder(Map.of("XDG_CONFIG_HOME", "/etc/me"), home, false))
                .isEqualTo(Path.of("/etc/me/clipramp/profiles"));
        assertThat(ProfileLibrary.userFolder(Map.of("XDG_CONFIG_HOME", "relative"), home, false))
                .isEqualTo(Path.of("/home/someone/.config/clipramp/profiles"));
        assertThat(ProfileLibrary.userFolder(Map.of("APPDATA", "/users/me"), home, true))
                .isEqualTo(Path.of("/users/me/clipramp/profiles"));
    }

    @Test
    void theDigestFollowsEveryInput() {
        String one =
                DesignFiles.load(new Source("a", base()), List.of(), SHIPPED).inputDigest();
        assertThat(DesignFiles.load(new Source("b", base()), List.of(), SHIPPED).inputDigest())
                .isEqualTo(one);
        assertThat(DesignFiles.load(new Source("a", base() + "\n"), List.of(), SHIPPED)
                        .inputDigest())
                .isNotEqualTo(one);
        assertThat(DesignFiles.load(new Source("a", base()), List.of("gate.overdrive=3"), SHIPPED)
                        .inputDigest())
                .isNotEqualTo(one);
    }

    @Test
    void ratedWithoutAVoltageTakesTheLinesAndSaysSo() {
        LoadedDesign loaded =
                DesignFiles.load(new Source("a", base()), List.of("load={kind: resistor, rated: 529 W}"), SHIPPED);
        assertThat(loaded.design().load().resistanceOhms()).isEqualTo(100);
        assertThat(loaded.assumed()).contains(new LoadedDesign.Assumed("load.rated", "at line.voltage, 230 V"));
    }

    @Test
    void aNominalThatIsTheMiddleOfABandIsNoted() {
        LoadedDesign loaded = DesignFiles.load(
                new Source("a", base()), List.of("trigger.device.interbase={min: 4 kΩ, max: 8 kΩ}"), SHIPPED);
        assertThat(loaded.notes())
                .containsExactly("trigger.device.interbase has no typical value; nominal is the middle of min and max,"
                        + " 6 kΩ.");
    }

    @Test
    void conditionsReadUnitsAndBareNumbers() {
        var line = load().line();
        assertThat(Conditions.lineVolts("207V", line)).isEqualTo(207);
        assertThat(Conditions.lineVolts("-10%", line)).isEqualTo(207);
        assertThat(Conditions.celsius("0degC")).isEqualTo(0);
        assertThat(Conditions.celsius("-5")).isEqualTo(-5);
        assertThat(Conditions.knob("50%")).isEqualTo(0.5);
        assertThat(Conditions.rampOhms("50k")).isEqualTo(50_000);
        assertThatThrownBy(() -> Conditions.knob("50"))
                .hasMessage("--knob read \"50\" (5000 %); expected 0 %..100 %. 50 %?");
    }
}
