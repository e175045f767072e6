package clipramp.firing;

import java.util.ArrayList;
import java.util.List;

/**
 * What {@link ReferenceIntegrator} finds in one half cycle (one period with a single diode).
 *
 * @param positive whether it begins at the line's rising zero
 * @param seconds its length, s
 * @param startVolts capacitor at its beginning, V
 * @param endVolts capacitor at its end, V
 * @param events everything that happened, in order
 * @param pulses every pulse that began
 * @param stalled whether the ramp was held for want of peak-point current
 * @param firingIndex first pulse that turns on and latches, -1 for none
 */
record ReferenceHalf(
        boolean positive,
        double seconds,
        double startVolts,
        double endVolts,
        List<Event> events,
        List<Pulse> pulses,
        boolean stalled,
        int firingIndex) {

    enum Kind {
        RECTIFIER_ON,
        RECTIFIER_OFF,
        ZENER_ON,
        ZENER_OFF,
        JUNCTION_ON,
        JUNCTION_OFF,
        CLAMP_ON,
        CLAMP_OFF,
        STALL,
        RELEASE,
        FIRE,
        VALLEY
    }

    /** What happened, when, and at which capacitor voltage. */
    record Event(Kind kind, double seconds, double volts) {}

    /** How half cycles follow each other. */
    enum Settling {
        STEADY,
        HUNTS,
        NEVER
    }

    /** The periodic state. */
    record Periodic(Settling settling, List<ReferenceHalf> halves) {}

    ReferenceHalf {
        events = List.copyOf(events);
        pulses = List.copyOf(pulses);
    }

    /** The same, a pulse that was still on at the zero followed to the end that it finds in the half cycle after. */
    ReferenceHalf continuedIn(ReferenceHalf next, double rampFarads) {
        int last = pulses.size() - 1;
        Event valley = next.events.stream()
                .filter(event -> event.kind() == Kind.VALLEY)
                .findFirst()
                .orElse(null);
        if (last < 0 || pulses.get(last).endSeconds() < seconds || valley == null) {
            return this;
        }
        double joules = 0.5 * rampFarads * (endVolts * endVolts - valley.volts() * valley.volts());
        List<Pulse> continued = new ArrayList<>(pulses);
        continued.set(last, ReferencePulseMeter.continued(pulses.get(last), seconds + valley.seconds(), joules));
        return new ReferenceHalf(positive, seconds, startVolts, endVolts, events, continued, stalled, firingIndex);
    }

    /** The order of events, without their times: two solutions of one shape can be compared time by time. */
    List<Kind> shape() {
        return events.stream().map(Event::kind).toList();
    }
}
