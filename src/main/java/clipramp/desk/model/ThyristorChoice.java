package clipramp.desk.model;

import clipramp.files.Profile;
import clipramp.files.ProfileLibrary;
import clipramp.units.Expected;
import clipramp.units.QuantityReader;
import clipramp.units.RefusedQuantityException;
import clipramp.units.Unit;
import java.util.Comparator;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.Collectors;

/**
 * The thyristor of a new design: the smallest whose voltage stands well over the crest and whose current stands well
 * over the load's.
 *
 * @param id its profile
 * @param small whether it is of the few amperes whose gates ask for little
 * @param sensitive whether its gate wants less than a milliampere, so that a resistor must hold the pulse back
 */
record ThyristorChoice(String id, boolean small, boolean sensitive) {
    /** Blocking voltage over the crest of the high line (common practice: 1.5 to 2). */
    private static final double VOLTS_RESERVE = 1.5;

    /** Rated current over the load's (common practice). */
    private static final double AMPS_RESERVE = 1.6;

    private static final double SMALL_AMPS = 4;
    private static final double SENSITIVE_AMPS = 1;

    private record Candidate(String id, double volts, double amps, boolean positive) {}

    /**
     * Chooses among a library's devices.
     *
     * @param library where profiles are found
     * @param triac whether a triac is wanted
     * @param crestVolts crest of the high line, V
     * @param amps rms load current at full power, A
     */
    static ThyristorChoice of(ProfileLibrary library, boolean triac, double crestVolts, double amps) {
        String kind = triac ? "triac" : "scr";
        List<Candidate> all = library.ids(kind).stream()
                .flatMap(id -> library.find(kind, id).stream())
                .map(found -> candidate(Profile.read(found)))
                .toList();
        Comparator<Candidate> smallest =
                Comparator.comparingDouble(Candidate::amps).thenComparingDouble(Candidate::volts);
        Candidate chosen = all.stream()
                .filter(Candidate::positive)
                .filter(c -> c.volts() >= VOLTS_RESERVE * crestVolts && c.amps() >= AMPS_RESERVE * amps)
                .min(smallest)
                .or(() -> all.stream()
                        .filter(Candidate::positive)
                        .max(Comparator.comparingDouble(Candidate::volts).thenComparingDouble(Candidate::amps)))
                .orElseThrow(() -> new IllegalStateException("the program has no " + kind + " profiles"));
        return new ThyristorChoice(chosen.id(), chosen.amps() <= SMALL_AMPS, chosen.amps() < SENSITIVE_AMPS);
    }

    private static Candidate candidate(Profile profile) {
        Map<String, String> figures = profile.figures().stream()
                .collect(Collectors.toMap(Profile.Figure::key, Profile.Figure::text, (a, b) -> a));
        return new Candidate(
                profile.id(),
                value(Optional.ofNullable(figures.get("limits.voltage")), Unit.VOLT),
                value(Optional.ofNullable(figures.get("limits.rms")), Unit.AMPERE),
                !profile.kind().equals("triac") || figures.containsKey("gate.quadrants.III+"));
    }

    private static double value(Optional<String> text, Unit unit) {
        try {
            return text.map(t -> QuantityReader.read(t, Expected.any(unit)).value())
                    .orElse(0.0);
        } catch (RefusedQuantityException e) {
            return 0;
        }
    }
}
