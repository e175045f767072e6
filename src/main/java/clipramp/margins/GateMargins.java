package clipramp.margins;

import clipramp.circuit.Condition;
import clipramp.circuit.Design;
import clipramp.circuit.GateDrive.Polarity;
import clipramp.circuit.Load;
import clipramp.circuit.Part;
import clipramp.circuit.ThyristorDevice;
import clipramp.circuit.ThyristorDevice.Kind;
import clipramp.circuit.ThyristorDevice.Quadrant;
import clipramp.firing.Pulse;
import clipramp.gate.LatchingNeed;
import clipramp.gate.TriggerNeed;
import clipramp.power.PulseLength;
import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.OptionalDouble;
import java.util.Set;

/** What the thyristor asks of the pulse (DEVELOPERS.md, Margins). */
final class GateMargins {
    private final Bench bench;
    private final Design design;
    private final ThyristorDevice device;

    GateMargins(Bench bench) {
        this.bench = bench;
        this.design = bench.design();
        this.device = design.thyristor().device();
    }

    List<Margin> all() {
        List<Margin> margins = new ArrayList<>();
        margins.add(polarity());
        margins.add(drive(MarginKind.GATE_PEAK_CURRENT));
        margins.add(drive(MarginKind.GATE_TIME));
        margins.add(drive(MarginKind.GATE_CHARGE));
        margins.add(latching(MarginKind.LATCHING_EARLIEST));
        margins.add(latching(MarginKind.LATCHING_LATEST));
        return margins;
    }

    private Margin polarity() {
        MarginKind kind = MarginKind.GATE_POLARITY;
        TriggerNeed need = TriggerNeed.of(design, Condition.SHEET_CELSIUS);
        String pulse = design.gate().polarity().word() + " pulse";
        Finding finding;
        if (device.kind() == Kind.SCR) {
            boolean wrong = design.gate().polarity() == Polarity.NEGATIVE;
            finding = new Finding(
                    "any condition",
                    0,
                    wrong ? 1 : 0,
                    kind.sense(),
                    pulse + " into an SCR, which needs a positive one");
        } else {
            finding = new Finding(
                    "any condition",
                    0,
                    need.missing().size(),
                    kind.sense(),
                    pulse + ": quadrants " + words(need.used())
                            + (need.missing().isEmpty()
                                    ? ", both specified"
                                    : "; not specified: " + words(need.missing())));
        }
        return Finding.worst(kind, List.of(finding));
    }

    private static String words(List<Quadrant> quadrants) {
        return String.join(" and ", quadrants.stream().map(Quadrant::word).toList());
    }

    /** R_E that the pulse is judged at: the earliest firing, and the latest that is meant as one. */
    private Set<Double> judgedOhms(JudgedCondition at) {
        Set<Double> ohms = new LinkedHashSet<>(List.of(bench.leastOhms()));
        bench.latestOhms(at.condition()).ifPresent(ohms::add);
        return ohms;
    }

    /** A demand on the drive, at the coldest junction, on the weakest trigger device, into a gate held at V_GT. */
    private Margin drive(MarginKind kind) {
        List<Finding> findings = new ArrayList<>();
        for (JudgedCondition at : bench.coldest()) {
            TriggerNeed need = TriggerNeed.of(design, at.condition().celsius());
            for (double ohms : judgedOhms(at)) {
                List<Pulse> pulses = bench.firstPulses(bench.held(at.condition(), ohms));
                if (pulses.isEmpty()) {
                    findings.add(noPulse(kind, at, need, ohms));
                }
                for (Pulse pulse : pulses) {
                    findings.add(driven(kind, at, need, pulse));
                }
            }
        }
        return Finding.worst(kind, findings);
    }

    private Finding noPulse(MarginKind kind, JudgedCondition at, TriggerNeed need, double ohms) {
        return new Finding(at.words(), demanded(kind, need), 0, kind.sense(), "no pulse at R_E = " + Say.ohms(ohms));
    }

    private double demanded(MarginKind kind, TriggerNeed need) {
        return switch (kind) {
            case GATE_PEAK_CURRENT -> design.gate().overdrive() * need.amps();
            case GATE_TIME -> device.gate().turnOnSeconds().orElse(Double.NaN);
            default -> need.amps() * design.gate().chargeSeconds();
        };
    }

    private Finding driven(MarginKind kind, JudgedCondition at, TriggerNeed need, Pulse pulse) {
        double demand = demanded(kind, need);
        String junction =
                "at " + Say.celsius(need.celsius()) + (need.extended() ? " (extended beyond the sheet's points)" : "");
        String held = "gate held at V_GT " + Say.volts(need.volts()) + " " + junction + shuntText(need.volts());
        if (kind == MarginKind.GATE_TIME && Double.isNaN(demand)) {
            return Finding.missing(kind, "any condition", "the profile states no thyristor.device.gate.turn-on");
        }
        return switch (kind) {
            case GATE_PEAK_CURRENT -> {
                String formula = Say.number(design.gate().overdrive()) + " x " + Say.amps(need.amps()) + " = "
                        + Say.amps(demand) + " wanted; " + held + " gets " + Say.amps(pulse.peakGateAmps());
                yield new Finding(at.words(), demand, pulse.peakGateAmps(), kind.sense(), formula);
            }
            case GATE_TIME -> {
                double offered = pulse.aboveTriggerSeconds();
                String formula = held + ": i_G >= I_GT " + Say.amps(need.amps()) + " for " + Say.seconds(offered)
                        + ", t_gt " + Say.seconds(demand);
                yield new Finding(at.words(), demand, offered, kind.sense(), formula);
            }
            default -> {
                String formula = Say.amps(need.amps()) + " x "
                        + Say.seconds(design.gate().chargeSeconds()) + " = " + Say.coulombs(demand) + " wanted; " + held
                        + " gets " + Say.coulombs(pulse.gateCoulombs());
                yield new Finding(at.words(), demand, pulse.gateCoulombs(), kind.sense(), formula);
            }
        };
    }

    /** The sheet's I_GT is the gate's alone: what R_GK takes at V_GT is not offered to it. */
    private String shuntText(double gateVolts) {
        return design.gate()
                .shunt()
                .map(Part::value)
                .map(ohms -> " (R_GK takes " + Say.amps(gateVolts / ohms) + " besides)")
                .orElse("");
    }

    private Margin latching(MarginKind kind) {
        List<Finding> findings = new ArrayList<>();
        for (JudgedCondition at : bench.conditions()) {
            OptionalDouble needed =
                    LatchingNeed.latchingAmps(design, at.condition().celsius());
            if (needed.isEmpty()) {
                findings.add(Finding.missing(kind, "any condition", "the profile states no thyristor.device.latching"));
                continue;
            }
            OptionalDouble ohms = kind == MarginKind.LATCHING_EARLIEST
                    ? OptionalDouble.of(bench.leastOhms())
                    : bench.latestOhms(at.condition());
            if (ohms.isEmpty()) {
                findings.add(Finding.missing(kind, at.words(), "no setting fires before the supply's collapse"));
                continue;
            }
            for (Pulse pulse : bench.firstPulses(bench.solution(at.condition(), ohms.getAsDouble()))) {
                findings.add(latched(kind, at, needed.getAsDouble(), pulse));
            }
        }
        return findings.isEmpty() ? Ceiling.unjudged(kind, "there is no pulse") : Finding.worst(kind, findings);
    }

    private Finding latched(MarginKind kind, JudgedCondition at, double needed, Pulse pulse) {
        double bleed = LatchingNeed.bleedAmps(design);
        return new Finding(
                at.words(),
                needed,
                pulse.anodeAmps(),
                kind.sense(),
                "pulse at " + Say.angle(pulse.startRad()) + ": " + Say.amps(pulse.anodeAmps())
                        + " as the gate current falls under I_GT; I_L " + Say.amps(needed - bleed)
                        + (bleed > 0 ? " + " + Say.amps(bleed) + " that the gate circuit bleeds away" : "")
                        + pulseNeeded(at, needed, pulse));
    }

    /** Through an inductance the current takes its time: how long the pulse would have to last for it. */
    private String pulseNeeded(JudgedCondition at, double needed, Pulse pulse) {
        if (!(design.load() instanceof Load.Inductive)) {
            return "";
        }
        OptionalDouble seconds = PulseLength.secondsToReach(design, at.condition(), pulse.startRad(), needed);
        return seconds.isEmpty()
                ? "; the load never takes that much when fired there"
                : "; the pulse lasts " + Say.seconds(pulse.aboveTriggerSeconds()) + " and would need "
                        + Say.seconds(seconds.getAsDouble());
    }
}
