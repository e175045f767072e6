package clipramp.desk.model;

import clipramp.circuit.ClipSupply.Rectifier;
import clipramp.circuit.ClipSupply.Tap;
import clipramp.circuit.Design;
import clipramp.circuit.Stage;
import clipramp.circuit.Wanted;
import clipramp.circuit.Winding;
import clipramp.files.DesignText;
import clipramp.files.ProfileLibrary;
import clipramp.files.Source;
import clipramp.sizing.FirstValues;
import clipramp.units.QuantityText;
import clipramp.units.Unit;
import java.util.Arrays;
import java.util.Optional;

/**
 * A design made from five answers: a sound structure for the stage, values by the relations of {@link FirstValues},
 * everything rounded to what can be bought. Margins say afterwards what it is worth.
 */
public final class Proposal {
    /** Current at the crest of the low line: bar, ramp and zener live on it and the dropper stays bearable. */
    private static final double CREST_AMPS = 0.027;

    /** A winding's supply costs no heat on the line's side, so that it may clip earlier. */
    private static final double WINDING_CREST_AMPS = 0.043;

    /** A zener well under the crest clips early; 20 V is as much as most trigger devices want. */
    private static final double ZENER_SHARE = 0.42;

    private static final double WINDING_ZENER_SHARE = 0.5;

    private static final double[] ZENERS = {20, 18, 16, 15, 13, 12};
    private static final double HALF = 0.5;

    private final Wish wish;
    private final Workshop workshop;
    private DesignText text;
    private Design design;

    private Proposal(Wish wish, Workshop workshop) {
        this.wish = wish;
        this.workshop = workshop;
        this.text = DesignText.of(new Source("new.yaml", skeleton()));
        this.design = workshop.read(text, Optional.empty()).design();
    }

    /**
     * The design file that answers a wish.
     *
     * @throws clipramp.files.InvalidInputException where an answer cannot be read
     */
    public static String of(Wish wish, Workshop workshop) {
        Proposal proposal = new Proposal(wish, workshop);
        proposal.coupling(proposal.thyristor());
        proposal.supply();
        proposal.ramp();
        proposal.ratings();
        return proposal.text.text();
    }

    private String skeleton() {
        return """
                # Proposed from five answers; every value is a start and yours to change.
                clipramp: 1
                title: <load>, <stage>
                line: <line>
                stage: <stage>
                load: {kind: resistor, rated: <load>}

                clip:
                  tap: <tap>
                  rectifier: <rectifier>
                  diode-drop: 0.7 V
                  dropper: 10 kΩ ±5 % 12 W 500 V
                  zener: zener-20v

                ramp:
                  capacitor: 220 nF ±5 % 63 V
                  fixed: 3.9 kΩ ±5 % 0.25 W
                  pot: {track: 25 kΩ ±10 % 0.5 W, end: 0 Ω, law: linear, sense: falling}

                trigger:
                  device: 2n2647
                  base-one: 33 Ω ±5 % 0.25 W
                  base-two: 330 Ω ±5 % 0.25 W

                gate: <gate>
                thyristor: {device: <thyristor>}

                surroundings: {coldest: <coldest>, hottest: <hottest>}
                wanted: {lowest: <lowest> at 0 %, highest: <highest> at 100 %}
                """.replace("<load>", wish.load())
                .replace("<stage>", wish.stage().word())
                .replace("<line>", wish.lineId())
                .replace("<tap>", (wish.stage() == Stage.BRIDGE_AC ? Tap.THYRISTOR : Tap.LINE).word())
                .replace("<rectifier>", (wish.stage() == Stage.HALF_WAVE ? Rectifier.DIODE : Rectifier.BRIDGE).word())
                .replace("<gate>", gate())
                .replace("<thyristor>", wish.stage() == Stage.TRIAC ? "2n6349" : "2n6405")
                .replace("<coldest>", wish.coldest())
                .replace("<hottest>", wish.hottest())
                .replace("<lowest>", wish.lowest())
                .replace("<highest>", wish.highest());
    }

    private String gate() {
        // Without a resistor the secondary shorts a conducting SCR's gate and with it raises what latches (model:
        // section 7).
        boolean twin = wish.stage() == Stage.INVERSE_PARALLEL;
        if (!twin && wish.stage() != Stage.TRIAC) {
            return "{coupling: direct, series: 0 Ω, shunt: 1 kΩ ±5 % 0.25 W}";
        }
        return "{coupling: transformer, series: " + (twin ? "10 Ω ±5 % 0.25 W" : "0 Ω")
                + ", shunt: 1 kΩ ±5 % 0.25 W, transformer: {ratio: 1, secondaries: " + (twin ? 2 : 1)
                + ", magnetising: 2 mH, primary-resistance: 0.5 Ω, secondary-resistance: 0.5 Ω, clamp: diode,"
                + " volt-seconds: 250 µVs}}";
    }

    private void set(String key, String value) {
        text = text.withValue(key, value);
    }

    private void read() {
        design = workshop.read(text, Optional.empty()).design();
    }

    /**
     * A small triac's supply comes from a winding where there is one for the line: no heat, and the gate directly. A
     * larger one asks for more than such a supply's pulse has.
     */
    private void coupling(ThyristorChoice choice) {
        String winding = "winding-" + QuantityText.number(design.line().volts(), 4) + "v-24v";
        ProfileLibrary library = workshop.library(Optional.empty());
        if (wish.stage() == Stage.TRIAC
                && choice.small()
                && library.find("winding", winding).isPresent()) {
            set("clip.winding", winding);
            set("gate.coupling", "direct");
            text = text.without("gate.transformer");
        } else if (wish.stage() == Stage.TRIAC || wish.stage() == Stage.INVERSE_PARALLEL) {
            set("trigger.base-one", "100 Ω ±5 % 0.25 W");
        }
        read();
    }

    private void supply() {
        double ratio = design.clip().winding().map(Winding::ratio).orElse(1.0);
        double low = design.line().lowVolts() * ratio;
        double high = design.line().highVolts() * ratio;
        double share = ratio < 1 ? WINDING_ZENER_SHARE : ZENER_SHARE;
        double zener = zenerVolts(share * Math.sqrt(2) * low);
        double drops = design.clip().rectifier().diodesInPath() * design.clip().diodeDropVolts();
        double crest = ratio < 1 ? WINDING_CREST_AMPS : CREST_AMPS;
        double dropper = FirstValues.dropperOhms(low, zener, drops, crest);
        set("clip.zener", "zener-" + QuantityText.number(zener, 3) + "v");
        set("clip.dropper", part(dropper, 50, Math.sqrt(2) * high));
        read();
    }

    private static double zenerVolts(double most) {
        return Arrays.stream(ZENERS).filter(volts -> volts <= most).findFirst().orElse(ZENERS[ZENERS.length - 1]);
    }

    private ThyristorChoice thyristor() {
        double amps = design.line().volts() / design.load().resistanceOhms();
        double crest = Math.sqrt(2) * design.line().highVolts();
        boolean triac = wish.stage() == Stage.TRIAC;
        ThyristorChoice choice = ThyristorChoice.of(workshop.library(Optional.empty()), triac, crest, amps);
        set("thyristor.device", choice.id());
        if (choice.sensitive()) {
            set("gate.series", "150 Ω ±5 % 0.25 W");
            set("trigger.base-one", "22 Ω ±5 % 0.25 W");
        }
        read();
        return choice;
    }

    private void ramp() {
        Optional<FirstValues.Span> span = FirstValues.span(
                design, goal(design.wanted().lowest()), goal(design.wanted().highest()));
        span.ifPresent(s -> {
            set("ramp.fixed", QuantityText.exact(s.fixedOhms(), Unit.OHM) + " ±5 % 0.25 W");
            set("ramp.pot.track", QuantityText.exact(s.trackOhms(), Unit.OHM) + " ±10 % 0.5 W");
        });
        read();
    }

    private static double goal(Optional<Wanted.Goal> goal) {
        return goal.filter(g -> g.measure() == Wanted.Measure.FRACTION)
                .map(g -> (g.from() + g.to()) / 2)
                .orElse(HALF);
    }

    /** What heat asks for: the dropper's rating and the thyristor's sink. */
    private void ratings() {
        double full = design.ramp().rampOhms(1);
        double most = Math.max(
                FirstValues.dropperWatts(design, full),
                FirstValues.dropperWatts(design, design.ramp().rampOhms(0)));
        double watts = FirstValues.ratedWatts(most, design.resistorDerating());
        double ratio = design.clip().winding().map(Winding::ratio).orElse(1.0);
        set(
                "clip.dropper",
                part(
                        design.clip().dropper().value(),
                        watts,
                        Math.sqrt(2) * design.line().highVolts() * ratio));
        FirstValues.caseToAmbient(design, full)
                .ifPresent(sink -> set("thyristor.case-to-ambient", QuantityText.exact(sink, Unit.KELVIN_PER_WATT)));
    }

    private static String part(double ohms, double watts, double volts) {
        return QuantityText.exact(ohms, Unit.OHM) + " ±5 % " + QuantityText.exact(watts, Unit.WATT) + " "
                + QuantityText.exact(FirstValues.ratedVolts(volts), Unit.VOLT);
    }
}
