package clipramp.margins;

import clipramp.margins.Margin.Sense;
import java.util.List;
import java.util.Optional;

/**
 * Every margin that is judged: its id in answers, its name, what it means, its formula, source and remedy. One table,
 * so that check, explain, window and record say the same; hence its length.
 */
public enum MarginKind {
    WANTED_LOWEST(
            "wanted-lowest",
            "lowest wanted setting",
            "At this knob position the load must get no more than wanted.lowest asks for (or lie within its band).",
            "what the load gets at the stated position <= wanted.lowest",
            "clipramp's circuit laws, DEVELOPERS.md; the wish is the design's own",
            "Make R_E larger at that end of the knob: a larger track, or a larger ramp capacitor.",
            "",
            Sense.AT_MOST,
            1,
            Verdict.FAILS,
            "wanted.lowest",
            "ramp.pot.track",
            "ramp.capacitor",
            "ramp.fixed"),
    WANTED_HIGHEST(
            "wanted-highest",
            "highest wanted setting",
            "At this knob position the load must get no less than wanted.highest asks for (or lie within its band).",
            "what the load gets at the stated position >= wanted.highest",
            "clipramp's circuit laws, DEVELOPERS.md; the wish is the design's own",
            "Make R_E smaller at that end of the knob: a smaller fixed resistor (mind latched-on) or a smaller ramp capacitor.",
            "",
            Sense.AT_LEAST,
            1,
            Verdict.FAILS,
            "wanted.highest",
            "ramp.fixed",
            "ramp.capacitor",
            "clip.dropper"),
    RAMP_BEFORE_COLLAPSE(
            "ramp-before-collapse",
            "ramp before the supply's collapse",
            "With the largest R_E the ramp must reach the peak point while the supply is still clipped; later it fires only on the collapse, or never.",
            "firing angle at the largest R_E <= angle at which the zener stops conducting",
            "clipramp's circuit laws, DEVELOPERS.md",
            "Make the largest R_E x C_E smaller: a smaller track, a resistor across the pot, or a smaller capacitor.",
            "deg",
            Sense.AT_MOST,
            1,
            Verdict.FAILS,
            "ramp.pot.track",
            "ramp.capacitor",
            "ramp.pot.shunt",
            "clip.dropper"),
    CLIP_BEFORE_FIRING(
            "clip-before-firing",
            "clip before the earliest firing",
            "The supply should be clipped before the earliest firing, or the firing angle follows the line voltage.",
            "angle at which the zener starts conducting <= firing angle at the smallest R_E",
            "clipramp's circuit laws, DEVELOPERS.md",
            "Reach the clip sooner (a smaller dropping resistor, a lower zener voltage) or fire later (a larger fixed resistor).",
            "deg",
            Sense.AT_MOST,
            1,
            Verdict.FAILS,
            "clip.dropper",
            "clip.zener",
            "ramp.fixed",
            "ramp.capacitor"),
    PEAK_POINT_CURRENT(
            "peak-point-current",
            "peak-point current",
            "With the largest R_E the resistor must still feed the peak-point current of the most demanding unit, or the ramp stalls at the peak point.",
            "(V_S - V_P)/R_E >= I_P, largest of the sheet",
            "clipramp's circuit laws, DEVELOPERS.md; I_P from the data sheet (profile)",
            "Make the largest R_E smaller and the capacitor larger by as much, or take a device with a smaller peak-point current.",
            "A",
            Sense.AT_LEAST,
            1.2,
            Verdict.FAILS,
            "ramp.pot.track",
            "ramp.capacitor",
            "trigger.device"),
    LATCHED_ON(
            "latched-on",
            "valley current",
            "With the smallest R_E the resistor must not feed the valley current, or the device stays on after its first pulse. With a supply that falls to zero with the line the first pulse of every half cycle still fires; what is lost are the repeated pulses of that half cycle, and device and ramp resistor get hotter.",
            "(V_S - V_V)/R_E <= I_V, smallest of the sheet",
            "clipramp's circuit laws, DEVELOPERS.md; I_V from the data sheet (profile)",
            "Make the fixed resistor larger, and the capacitor smaller by as much to keep the time; or take a device with a larger valley current.",
            "A",
            Sense.AT_MOST,
            1.2,
            Verdict.FAILS,
            "ramp.fixed",
            "ramp.capacitor",
            "trigger.device"),
    END_PULSE(
            "end-pulse",
            "end pulse",
            "As the supply collapses the peak point falls onto the ramp and fires it a few degrees before the load's zero. The power that leaks so must not exceed the lowest wanted (1 % of full power where nothing is wanted).",
            "power that the load gets from the end pulse <= lowest wanted power",
            "clipramp's circuit laws, DEVELOPERS.md; 1 % is a rule of ours",
            "Keep the ramp away from the peak point at the end of the half cycle: a larger R_E x C_E, or accept what leaks.",
            "W",
            Sense.AT_MOST,
            1,
            Verdict.FAILS,
            "ramp.pot.track",
            "ramp.capacitor",
            "clip.dropper"),
    FULL_POWER_PULSE(
            "full-power-pulse",
            "pulse that spills into the next half cycle",
            "With a winding that lags, a late pulse falls after the load's zero and fires the next half cycle at once: full power where least is wanted.",
            "number of judged settings at which a pulse acts in the half cycle after its own = 0",
            "clipramp's circuit laws, DEVELOPERS.md",
            "Take a winding that does not lag, or keep the latest firing ahead of the load's zero by more than the lag.",
            "",
            Sense.AT_MOST,
            1,
            Verdict.FAILS,
            "clip.winding",
            "ramp.pot.track",
            "ramp.capacitor"),
    SILENT(
            "silent",
            "fires at the high-power end",
            "With the smallest R_E the thyristor must be turned on and latched in every judged condition.",
            "number of judged conditions without firing at the smallest R_E = 0",
            "clipramp's circuit laws, DEVELOPERS.md",
            "Look at the gate, latching and peak-point margins: the one that fails says why.",
            "",
            Sense.AT_MOST,
            1,
            Verdict.FAILS,
            "ramp.fixed",
            "gate.coupling",
            "thyristor.device"),
    HUNTING(
            "hunting",
            "hunting",
            "Successive half cycles of the firing circuit should repeat; where they alternate, the firing angle does too, by no more than half a degree if all is well.",
            "firing angles of alternating half cycles differ by <= 0.5 degree",
            "clipramp's circuit laws, DEVELOPERS.md; the half degree is a rule of ours",
            "Empty the capacitor at every line zero: avoid settings where a pulse begins as the supply collapses; change the largest R_E x C_E a little.",
            "deg",
            Sense.AT_MOST,
            1,
            Verdict.FAILS,
            "ramp.capacitor",
            "ramp.pot.track",
            "clip.dropper"),
    DC_IN_LOAD(
            "dc-in-load",
            "dc in the line current",
            "A full-wave stage that fires its half cycles unlike draws dc from the line, which transformers and motors do not bear.",
            "|dc| <= 1 % of the load's full rms current",
            "common practice; the 1 % is a rule of ours",
            "Make both half cycles alike: no even harmonics, no hunting, one gate drive for both.",
            "A",
            Sense.AT_MOST,
            1,
            Verdict.FAILS,
            "line.harmonics",
            "ramp.capacitor"),
    ANGLE_DRIFT(
            "angle-drift",
            "firing angle against the line",
            "How far line voltage (low to high) and frequency (1 % either way) alone move the firing angle at mid-knob.",
            "largest change of the firing angle <= 3 degrees",
            "EN 50160 for the frequency; the 3 degrees are a rule of ours, and the verdict is at worst tight",
            "Clip sooner and flatter: a smaller dropping resistor, a lower zener voltage or one with a smaller slope.",
            "deg",
            Sense.AT_MOST,
            1,
            Verdict.TIGHT,
            "clip.dropper",
            "clip.zener",
            "ramp.capacitor"),
    GATE_POLARITY(
            "gate-polarity",
            "gate polarity and quadrants",
            "An SCR needs a positive pulse; a triac must be specified in both quadrants that the pulse's polarity uses.",
            "number of quadrants used but not specified (for an SCR: 1 for a negative pulse) = 0",
            "IEC 60747-6; quadrants from the data sheet (profile)",
            "Turn the pulse over (gate.polarity), or take a triac that is specified in those quadrants.",
            "",
            Sense.AT_MOST,
            1,
            Verdict.FAILS,
            "gate.polarity",
            "thyristor.device"),
    GATE_PEAK_CURRENT(
            "gate-peak-current",
            "peak gate current",
            "The pulse of the weakest trigger device of its type must drive overdrive x I_GT into a gate held at V_GT of the coldest junction.",
            "i_G,peak into V_GT >= overdrive x I_GT",
            "I_GT, V_GT and V_OB1 minimum from the data sheet (profile); overdrive 3..5 common practice",
            "Give the pulse more: a larger capacitor, a higher clip voltage, a larger base-one resistor (mind the standing gate voltage), a smaller gate series resistor, or a more sensitive thyristor.",
            "A",
            Sense.AT_LEAST,
            1,
            Verdict.FAILS,
            "ramp.capacitor",
            "clip.zener",
            "trigger.base-one",
            "gate.series",
            "gate.shunt",
            "trigger.device",
            "thyristor.device"),
    GATE_TIME(
            "gate-time",
            "gate pulse time",
            "The gate current into a gate held at V_GT of the coldest junction must stay at or above I_GT for the turn-on time.",
            "time with i_G >= I_GT >= t_gt",
            "I_GT, V_GT and t_gt from the data sheet (profile)",
            "Make the pulse longer: a larger capacitor, a larger base-one resistor, or a more sensitive thyristor.",
            "s",
            Sense.AT_LEAST,
            1.2,
            Verdict.FAILS,
            "ramp.capacitor",
            "trigger.base-one",
            "gate.series",
            "thyristor.device"),
    GATE_CHARGE(
            "gate-charge",
            "gate charge",
            "A short pulse should carry the charge of I_GT for gate.charge-time (20 us unless the design says otherwise).",
            "charge into the gate >= I_GT x charge time",
            "common practice for short pulses; the verdict is at worst tight",
            "Make the pulse carry more: a larger capacitor or a more sensitive thyristor.",
            "C",
            Sense.AT_LEAST,
            1,
            Verdict.TIGHT,
            "ramp.capacitor",
            "trigger.base-one",
            "gate.charge-time",
            "thyristor.device"),
    GATE_STANDING_VOLTAGE(
            "gate-standing-voltage",
            "standing gate voltage",
            "Between pulses the base bar's current through base one's resistor lifts the gate; at the hottest junction that must stay under V_GD, or the thyristor may fire by itself.",
            "V_S R1p/(R2 + R_BB + R1p), divided by R_G and R_GK, at the smallest R_BB and the highest supply <= V_GD",
            "clipramp's circuit laws, DEVELOPERS.md; V_GD from the data sheet (profile)",
            "Make the base-one resistor smaller, add a gate shunt behind a series resistor, or couple by a transformer.",
            "V",
            Sense.AT_MOST,
            1.2,
            Verdict.FAILS,
            "trigger.base-one",
            "trigger.base-two",
            "gate.shunt",
            "gate.series",
            "trigger.device"),
    GATE_CURRENT_LIMIT(
            "gate-current-limit",
            "gate current limit",
            "The largest gate current into the typical gate must stay under I_GM.",
            "i_G,peak <= I_GM",
            "I_GM from the data sheet (profile)",
            "Put resistance in series with the gate, or a smaller capacitor.",
            "A",
            Sense.AT_MOST,
            1.2,
            Verdict.FAILS,
            "gate.series",
            "ramp.capacitor",
            "trigger.base-one"),
    GATE_VOLTAGE_LIMIT(
            "gate-voltage-limit",
            "gate voltage limit",
            "The largest gate voltage at the typical gate must stay under V_GM.",
            "v_GK,peak <= V_GM",
            "V_GM from the data sheet (profile)",
            "Put resistance in series with the gate, or a smaller shunt.",
            "V",
            Sense.AT_MOST,
            1.2,
            Verdict.FAILS,
            "gate.series",
            "gate.shunt",
            "trigger.base-one"),
    GATE_POWER_LIMIT(
            "gate-power-limit",
            "gate peak power",
            "The peak gate power must stay under P_GM, which holds for a stated pulse length only. A longer pulse is allowed no more energy than P_GM for that length, and never less than the mean rating.",
            "peak of v_GK i_G <= P_GM; for a pulse of width w beyond the rated length t: P_GM t/w, w = gate energy / peak power",
            "P_GM and its pulse length from the data sheet (profile); equal energy beyond it is clipramp's circuit laws, DEVELOPERS.md",
            "Put resistance in series with the gate, or a smaller capacitor.",
            "W",
            Sense.AT_MOST,
            1.2,
            Verdict.FAILS,
            "gate.series",
            "ramp.capacitor",
            "trigger.base-one"),
    GATE_MEAN_POWER(
            "gate-mean-power",
            "gate mean power",
            "All pulses of a half cycle together must stay under P_G(AV).",
            "gate energy a pulse x pulses a second <= P_G(AV)",
            "P_G(AV) from the data sheet (profile)",
            "Fewer repeated pulses (a larger smallest R_E) or resistance in series with the gate.",
            "W",
            Sense.AT_MOST,
            1.2,
            Verdict.FAILS,
            "gate.series",
            "ramp.fixed",
            "ramp.capacitor"),
    GATE_REVERSE_VOLTAGE(
            "gate-reverse-voltage",
            "gate reverse voltage",
            "As a pulse transformer's core resets, the gate goes negative; that must stay within V_RGM.",
            "largest negative v_GK <= V_RGM",
            "clipramp's circuit laws, DEVELOPERS.md; V_RGM from the data sheet (profile)",
            "Clamp the transformer's primary with a diode.",
            "V",
            Sense.AT_MOST,
            1.2,
            Verdict.FAILS,
            "gate.transformer.clamp",
            "gate.shunt"),
    TRANSFORMER_VOLT_SECONDS(
            "transformer-volt-seconds",
            "pulse transformer volt-seconds",
            "One pulse's voltage over time at the primary must stay under what the core bears before it saturates.",
            "integral of the primary's voltage over one pulse <= rating",
            "clipramp's circuit laws, DEVELOPERS.md; the part's rating",
            "A smaller capacitor, a lower clip voltage, or a transformer with a larger rating.",
            "Vs",
            Sense.AT_MOST,
            1.2,
            Verdict.FAILS,
            "gate.transformer.volt-seconds",
            "ramp.capacitor",
            "clip.zener"),
    TRANSFORMER_CORE(
            "transformer-core",
            "pulse transformer core",
            "The core must not saturate by steps: its largest magnetising current, with what the standing current and"
                    + " the pulses before have left, must stay under what the volt-seconds rating allows.",
            "L_m x I_m,peak <= volt-seconds rating",
            "clipramp's circuit laws, DEVELOPERS.md; the part's rating",
            "A transformer with a larger rating; or reset faster: no clamp diode (mind the gate's reverse voltage) or a"
                    + " larger base-one resistor; or fewer repeated pulses.",
            "Vs",
            Sense.AT_MOST,
            1.2,
            Verdict.FAILS,
            "gate.transformer.volt-seconds",
            "gate.transformer.clamp",
            "trigger.base-one",
            "trigger.base-two",
            "ramp.fixed"),
    LATCHING_EARLIEST(
            "latching-earliest",
            "latching at the earliest firing",
            "When the gate current of the first pulse at the smallest R_E falls under I_GT, the anode current must have reached the latching current, raised by what the gate circuit bleeds away.",
            "i_A >= I_L + 0.7 V/(R_GK parallel (R_G + R1))",
            "clipramp's circuit laws, DEVELOPERS.md; I_L from the data sheet (profile)",
            "Fire a little later (a larger fixed resistor), a longer pulse, a larger load, or a thyristor with a smaller latching current.",
            "A",
            Sense.AT_LEAST,
            1.2,
            Verdict.FAILS,
            "ramp.fixed",
            "load",
            "thyristor.device",
            "gate.shunt",
            "trigger.base-one"),
    LATCHING_LATEST(
            "latching-latest",
            "latching at the latest firing",
            "When the gate current of the first pulse at the largest R_E falls under I_GT, the anode current must have reached the latching current, raised by what the gate circuit bleeds away.",
            "i_A >= I_L + 0.7 V/(R_GK parallel (R_G + R1))",
            "clipramp's circuit laws, DEVELOPERS.md; I_L from the data sheet (profile)",
            "Keep the latest firing further from the line's zero (a smaller track), a larger load, or a thyristor with a smaller latching current.",
            "A",
            Sense.AT_LEAST,
            1.2,
            Verdict.FAILS,
            "ramp.pot.track",
            "load",
            "thyristor.device",
            "gate.shunt",
            "trigger.base-one"),
    TURN_OFF_TIME(
            "turn-off-time",
            "turn-off time",
            "On the dc side of a bridge the thyristor sees no reverse voltage: it turns off only while its current is under the holding current around the line's zero, and that must last longer than t_q.",
            "time with i <= I_H >= t_q",
            "clipramp's circuit laws, DEVELOPERS.md; I_H and t_q from the data sheet (profile)",
            "A faster thyristor, one with a larger holding current, or load and thyristor on the ac side.",
            "s",
            Sense.AT_LEAST,
            1.2,
            Verdict.FAILS,
            "thyristor.device",
            "load",
            "stage"),
    INTERBASE_VOLTAGE(
            "interbase-voltage",
            "interbase voltage",
            "The largest voltage between the bases must stay under the device's limit.",
            "V_B2B1 <= limit",
            "limit from the data sheet (profile)",
            "A lower zener voltage or a larger base-two resistor.",
            "V",
            Sense.AT_MOST,
            1.2,
            Verdict.FAILS,
            "clip.zener",
            "trigger.base-two",
            "trigger.device"),
    EMITTER_PEAK_CURRENT(
            "emitter-peak-current",
            "emitter peak current",
            "The capacitor's discharge must stay under the device's peak current.",
            "i_E,peak <= limit",
            "limit from the data sheet (profile)",
            "A larger base-one resistor or a smaller capacitor.",
            "A",
            Sense.AT_MOST,
            1.2,
            Verdict.FAILS,
            "trigger.base-one",
            "ramp.capacitor",
            "trigger.device"),
    EMITTER_RMS_CURRENT(
            "emitter-rms-current",
            "emitter rms current",
            "All pulses together must stay under the device's rms (programmable: dc) current.",
            "i_E,rms <= limit",
            "limit from the data sheet (profile)",
            "Fewer repeated pulses: a larger smallest R_E; or a smaller capacitor.",
            "A",
            Sense.AT_MOST,
            1.2,
            Verdict.FAILS,
            "ramp.fixed",
            "ramp.capacitor",
            "trigger.device"),
    EMITTER_REVERSE_VOLTAGE(
            "emitter-reverse-voltage",
            "emitter reverse voltage",
            "With the capacitor empty the whole supply stands in reverse between base two and emitter (programmable: gate and anode).",
            "V_S - V_C <= limit",
            "limit from the data sheet (profile)",
            "A lower zener voltage.",
            "V",
            Sense.AT_MOST,
            1.2,
            Verdict.FAILS,
            "clip.zener",
            "trigger.device"),
    EMITTER_CAPACITOR(
            "emitter-capacitor",
            "capacitor that the device may discharge",
            "The peak current rating holds up to a stated capacitor (programmable: discharge energy).",
            "C_E <= limit, or C_E V^2/2 <= limit",
            "limit from the data sheet (profile)",
            "A smaller capacitor, or resistance in the emitter.",
            "F",
            Sense.AT_MOST,
            1.2,
            Verdict.FAILS,
            "ramp.capacitor",
            "trigger.device"),
    TRIGGER_POWER(
            "trigger-power",
            "trigger device power",
            "Base bar and emitter together must stay under the device's power, derated for the air around it.",
            "P_D <= P(25 degC) - derating x (T - 25 degC)",
            "rating and derating from the data sheet (profile)",
            "Fewer repeated pulses, a larger base-two resistor or a lower zener voltage.",
            "W",
            Sense.AT_MOST,
            1.2,
            Verdict.FAILS,
            "trigger.base-two",
            "clip.zener",
            "ramp.fixed",
            "trigger.device"),
    CAPACITOR_VOLTAGE(
            "capacitor-voltage",
            "ramp capacitor voltage",
            "The ramp's highest voltage must stay under the capacitor's rating.",
            "V_C,max <= rated voltage",
            "the part's rating",
            "A capacitor with a higher rated voltage.",
            "V",
            Sense.AT_MOST,
            1.2,
            Verdict.FAILS,
            "ramp.capacitor"),
    DROPPER_POWER(
            "dropper-power",
            "dropping resistor power",
            "The dropping resistor runs hot all its life: it may use only the stated share of its rating.",
            "mean of i_D^2 R_D <= derating x rating",
            "the part's rating; share of it from derating.resistors (50..60 % common practice)",
            "A larger rating (or two in series), or a larger resistance if the clip margins allow it.",
            "W",
            Sense.AT_MOST,
            1,
            Verdict.FAILS,
            "clip.dropper",
            "derating.resistors"),
    DROPPER_VOLTAGE(
            "dropper-voltage",
            "dropping resistor voltage",
            "The peak voltage across the dropping resistor must stay under its voltage rating, whatever its power.",
            "peak of i_D R_D <= rated voltage",
            "the part's rating",
            "A resistor with a higher rated voltage, or two in series.",
            "V",
            Sense.AT_MOST,
            1.2,
            Verdict.FAILS,
            "clip.dropper"),
    ZENER_POWER(
            "zener-power",
            "zener power",
            "The zener must bear its mean power at the high line.",
            "mean of V_S i_Z <= rated power",
            "rating from the data sheet (profile)",
            "A larger dropping resistor or a zener with a larger rating.",
            "W",
            Sense.AT_MOST,
            1.2,
            Verdict.FAILS,
            "clip.zener",
            "clip.dropper"),
    BASE_ONE_POWER(
            "base-one-power",
            "base-one resistor power",
            "Mean power of the base-one resistor against its derated rating.",
            "P_R1 <= derating x rating",
            "the part's rating; share of it from derating.resistors (50..60 % common practice)",
            "A larger rating.",
            "W",
            Sense.AT_MOST,
            1,
            Verdict.FAILS,
            "trigger.base-one",
            "derating.resistors"),
    BASE_TWO_POWER(
            "base-two-power",
            "base-two resistor power",
            "Mean power of the base-two resistor (programmable: of divider's upper resistor) against its derated rating.",
            "P_R2 <= derating x rating",
            "the part's rating; share of it from derating.resistors (50..60 % common practice)",
            "A larger rating.",
            "W",
            Sense.AT_MOST,
            1,
            Verdict.FAILS,
            "trigger.base-two",
            "derating.resistors"),
    RAMP_RESISTOR_POWER(
            "ramp-resistor-power",
            "fixed ramp resistor power",
            "Mean power of the fixed ramp resistor against its derated rating.",
            "P_RE x fixed/R_E <= derating x rating",
            "the part's rating; share of it from derating.resistors (50..60 % common practice)",
            "A larger rating.",
            "W",
            Sense.AT_MOST,
            1,
            Verdict.FAILS,
            "ramp.fixed",
            "derating.resistors"),
    POT_POWER(
            "pot-power",
            "pot power",
            "A pot's rating is for its whole track: the current through it, times the whole track, must stay under the derated rating.",
            "P_RE/R_E x track <= derating x rating",
            "the part's rating; share of it from derating.resistors (50..60 % common practice)",
            "A pot with a larger rating, or a larger fixed resistor.",
            "W",
            Sense.AT_MOST,
            1,
            Verdict.FAILS,
            "ramp.pot.track",
            "ramp.fixed",
            "derating.resistors"),
    BLOCKING_VOLTAGE(
            "blocking-voltage",
            "thyristor blocking voltage",
            "The thyristor must block the crest of the highest line; surges come on top.",
            "crest of the highest line <= V_DRM",
            "V_DRM from the data sheet (profile)",
            "A thyristor of a higher voltage class; surges ask for about twice the crest (common practice).",
            "V",
            Sense.AT_MOST,
            1.2,
            Verdict.FAILS,
            "thyristor.device",
            "line.high"),
    THYRISTOR_RMS(
            "thyristor-rms-current",
            "thyristor rms current",
            "One thyristor's rms current at the highest setting must stay under I_T(RMS).",
            "I_T,rms <= I_T(RMS)",
            "I_T(RMS) from the data sheet (profile)",
            "A larger thyristor or a smaller load.",
            "A",
            Sense.AT_MOST,
            1.2,
            Verdict.FAILS,
            "thyristor.device",
            "load"),
    THYRISTOR_MEAN(
            "thyristor-mean-current",
            "thyristor mean current",
            "One thyristor's mean current at the highest setting must stay under I_T(AV).",
            "I_T,mean <= I_T(AV)",
            "I_T(AV) from the data sheet (profile)",
            "A larger thyristor or a smaller load.",
            "A",
            Sense.AT_MOST,
            1.2,
            Verdict.FAILS,
            "thyristor.device",
            "load"),
    JUNCTION_TEMPERATURE(
            "junction-temperature",
            "junction temperature",
            "The junction's rise above the air must stay under what T_J,max leaves.",
            "P_T (R_thJC + R_thCA) <= T_J,max - T_air",
            "T_J,max and R_thJC from the data sheet (profile); loss by clipramp's circuit laws, DEVELOPERS.md",
            "A larger sink (a smaller thyristor.case-to-ambient).",
            "K",
            Sense.AT_MOST,
            1.2,
            Verdict.FAILS,
            "thyristor.case-to-ambient",
            "thyristor.device",
            "load");

    private final String id;
    private final String title;
    private final String meaning;
    private final String formula;
    private final String source;
    private final String remedy;
    private final String unit;
    private final Sense sense;
    private final double holdsFrom;
    private final Verdict gravest;
    private final List<String> parts;

    MarginKind(
            String id,
            String title,
            String meaning,
            String formula,
            String source,
            String remedy,
            String unit,
            Sense sense,
            double holdsFrom,
            Verdict gravest,
            String... parts) {
        this.id = id;
        this.title = title;
        this.meaning = meaning;
        this.formula = formula;
        this.source = source;
        this.remedy = remedy;
        this.unit = unit;
        this.sense = sense;
        this.holdsFrom = holdsFrom;
        this.gravest = gravest;
        this.parts = List.of(parts);
    }

    /** The margin with an id such as gate-peak-current, if there is one. */
    public static Optional<MarginKind> byId(String id) {
        for (MarginKind kind : values()) {
            if (kind.id.equals(id)) {
                return Optional.of(kind);
            }
        }
        return Optional.empty();
    }

    /** The id in answers, such as gate-peak-current. */
    public String id() {
        return id;
    }

    /** The name that people read. */
    public String title() {
        return title;
    }

    /** What is asked, and why, in a sentence or two. */
    public String meaning() {
        return meaning;
    }

    /** The formula in symbols. */
    public String formula() {
        return formula;
    }

    /** Where demand and formula come from. */
    public String source() {
        return source;
    }

    /** What to change, in which direction. */
    public String remedy() {
        return remedy;
    }

    /** SI unit of demand and offer; "deg" for angles, empty for shares and counts. */
    public String unit() {
        return unit;
    }

    /** Which side is good; a wanted band or angle may turn it round in its row. */
    public Sense sense() {
        return sense;
    }

    /** Ratio from which it holds: 1.2 for raw data-sheet demands and ceilings, 1 where reserve is in the demand. */
    public double holdsFrom() {
        return holdsFrom;
    }

    /** The gravest verdict that it can come to: tight for rules of thumb. */
    public Verdict gravest() {
        return gravest;
    }

    /** Design keys that move it. */
    public List<String> parts() {
        return parts;
    }
}
