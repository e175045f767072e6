package clipramp.faults;

import clipramp.circuit.TestPoint;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;

/** The symptom sheet read backwards: which single faults fit what was seen (DEVELOPERS.md, Single faults). */
public final class Diagnosis {
    /** A reading fits within this share of the larger of it and what is expected: parts and meters stray so far. */
    private static final double SHARE = 0.15;

    /** Where both are next to nothing, what leaks, hum and a meter's own resistance leave: TP3, TP4; TP1, TP2; TP5, V. */
    private static final double LEAST_GATE_VOLTS = 0.02;

    private static final double LEAST_SUPPLY_VOLTS = 0.2;
    private static final double LEAST_LINE_VOLTS = 2;

    private Diagnosis() {}

    /**
     * One candidate.
     *
     * @param effect the fault and what follows from it; the healthy circuit is a candidate too
     * @param fits observations that it explains
     * @param contradicts observations that it does not, each with what would be seen instead
     * @param misfit how far the readings that were seen lie from those expected, as a sum of multiples of what
     *     good parts and meters stray; smaller is better
     */
    public record Candidate(
            FaultEffect effect, List<Observation> fits, List<Contradiction> contradicts, double misfit) {
        /** Keeps copies of the lists. */
        public Candidate {
            fits = List.copyOf(fits);
            contradicts = List.copyOf(contradicts);
        }
    }

    /**
     * An observation that a fault does not explain.
     *
     * @param seen what was seen
     * @param instead what would be seen with that fault
     */
    public record Contradiction(Observation seen, String instead) {}

    /**
     * All faults and the healthy circuit: fewest contradictions first, then the nearest readings.
     *
     * @param sheet every single fault, worked out
     * @param seen what was seen, on the circuit that the sheet is for
     */
    public static List<Candidate> rank(FaultSheet sheet, List<Observation> seen) {
        List<FaultEffect> effects = new ArrayList<>(sheet.faults());
        effects.add(sheet.healthy());
        return effects.stream()
                .map(effect -> candidate(effect, seen))
                .sorted(Comparator.comparingInt(
                                (Candidate candidate) -> candidate.contradicts().size())
                        .thenComparingDouble(Candidate::misfit))
                .toList();
    }

    private static Candidate candidate(FaultEffect effect, List<Observation> seen) {
        List<Observation> fits = new ArrayList<>();
        List<Contradiction> contradicts = new ArrayList<>();
        double misfit = 0;
        for (Observation one : seen) {
            if (fits(effect, one)) {
                fits.add(one);
            } else {
                contradicts.add(new Contradiction(one, instead(effect, one)));
            }
            misfit += one instanceof Observation.Volts volts ? distance(effect, volts) : 0;
        }
        return new Candidate(effect, fits, contradicts, misfit);
    }

    private static boolean fits(FaultEffect effect, Observation seen) {
        if (seen instanceof Observation.Load load) {
            return load.gets().contains(effect.gets());
        }
        if (seen instanceof Observation.Knob knob) {
            return knob.acts() == effect.knobActs();
        }
        if (seen instanceof Observation.Volts volts) {
            return distance(effect, volts) <= 1;
        }
        if (seen instanceof Observation.Fuse fuse) {
            return fuse.blown() == effect.over().stream().anyMatch(Burden::isUnlimited);
        }
        Observation.Burnt burnt = (Observation.Burnt) seen;
        // A part found burnt may be the fault itself or what the fault burnt next.
        return effect.fault().part().equals(burnt.part())
                || effect.over().stream().anyMatch(burden -> burden.part().equals(burnt.part()));
    }

    /** How many times the tolerated distance a reading is off. */
    private static double distance(FaultEffect effect, Observation.Volts seen) {
        double expected = expected(effect, seen);
        double tolerated = leastVolts(seen.point()) + SHARE * Math.max(Math.abs(expected), Math.abs(seen.volts()));
        return Math.abs(expected - seen.volts()) / tolerated;
    }

    private static double leastVolts(TestPoint point) {
        return switch (point) {
            case TP5 -> LEAST_LINE_VOLTS;
            case TP3, TP4 -> LEAST_GATE_VOLTS;
            default -> LEAST_SUPPLY_VOLTS;
        };
    }

    private static double expected(FaultEffect effect, Observation.Volts seen) {
        return effect.volts(seen.point(), seen.meter());
    }

    private static String instead(FaultEffect effect, Observation seen) {
        if (seen instanceof Observation.Load) {
            return "load: " + effect.gets().word();
        }
        if (seen instanceof Observation.Knob) {
            return "knob " + (effect.knobActs() ? "acts" : "dead");
        }
        if (seen instanceof Observation.Volts volts) {
            return volts.point() + " " + volts.meter().word() + " " + Said.volts(expected(effect, volts));
        }
        if (seen instanceof Observation.Fuse fuse) {
            return fuse.blown() ? "nothing that blows the fuse" : "the fuse blows";
        }
        return "nothing that burns it";
    }
}
