package clipramp.circuit;

import java.util.Optional;
import java.util.OptionalDouble;

/**
 * Unijunction transistor, data-sheet figures at 25 °C.
 *
 * @param id profile or in-place name
 * @param standoff intrinsic standoff ratio eta, 0..1
 * @param interbaseOhms R_BB, ohm, above 0
 * @param interbaseDriftPerKelvin relative drift of R_BB, 1/K
 * @param emitterDropVolts V_D, V, 0 or more
 * @param emitterDriftVoltsPerKelvin drift of V_D, V/K, negative
 * @param peakCurrentAmps I_P, A, 0 or more
 * @param valley the valley point
 * @param saturation a point of the saturated emitter line
 * @param modulated interbase current with the emitter conducting, if the sheet has it
 * @param baseOnePulse V_OB1 in its test circuit, if the sheet has it
 * @param limits absolute ratings
 */
public record Unijunction(
        String id,
        Characteristic standoff,
        Characteristic interbaseOhms,
        Characteristic interbaseDriftPerKelvin,
        Characteristic emitterDropVolts,
        Characteristic emitterDriftVoltsPerKelvin,
        Characteristic peakCurrentAmps,
        Valley valley,
        Saturation saturation,
        Optional<Modulated> modulated,
        Optional<BaseOnePulse> baseOnePulse,
        Limits limits) {

    /**
     * The valley point.
     *
     * @param amps I_V, A, above 0
     * @param volts V_V, emitter to base one, V, above 0
     * @param atVolts interbase voltage V_spec of both, V, above 0
     */
    public record Valley(Characteristic amps, Characteristic volts, double atVolts) {
        /** @throws IllegalArgumentException outside the stated ranges */
        public Valley {
            Require.positive("valley current", amps.nominal());
            Require.positive("valley voltage", volts.nominal());
            Require.positive("interbase voltage of the valley point", atVolts);
        }
    }

    /**
     * A point of the saturated emitter line.
     *
     * @param volts V_EB1(sat), V, above 0
     * @param amps emitter current of that point, A, above 0
     * @param atVolts interbase voltage of that point, V, above 0
     */
    public record Saturation(Characteristic volts, double amps, double atVolts) {
        /** @throws IllegalArgumentException outside the stated ranges */
        public Saturation {
            Require.positive("saturation voltage", volts.nominal());
            Require.positive("saturation current", amps);
            Require.positive("interbase voltage of the saturation point", atVolts);
        }
    }

    /**
     * The interbase current with the emitter conducting.
     *
     * @param amps I_B2(mod), A, above 0
     * @param atVolts interbase voltage of that point, V, above 0
     */
    public record Modulated(Characteristic amps, double atVolts) {
        /** @throws IllegalArgumentException outside the stated ranges */
        public Modulated {
            Require.positive("modulated interbase current", amps.nominal());
            Require.positive("interbase voltage of the modulated current", atVolts);
        }
    }

    /**
     * V_OB1 and the circuit that it is measured in (DEVELOPERS.md, The conducting device).
     *
     * @param minVolts least base-one pulse of any device, V
     * @param typVolts typical base-one pulse, V; at least one of the two
     * @param supplyVolts supply V_t of the test circuit, V, above 0
     * @param capacitorFarads capacitor of the test circuit, F, above 0
     * @param baseOneOhms base-one resistor R_t of the test circuit, ohm, above 0
     */
    public record BaseOnePulse(
            OptionalDouble minVolts,
            OptionalDouble typVolts,
            double supplyVolts,
            double capacitorFarads,
            double baseOneOhms) {
        /** @throws IllegalArgumentException outside the stated ranges, or where neither pulse is given */
        public BaseOnePulse {
            if (minVolts.isEmpty() && typVolts.isEmpty()) {
                throw new IllegalArgumentException("a base-one pulse needs min or typ");
            }
            Require.positive("test supply", supplyVolts);
            Require.positive("test capacitor", capacitorFarads);
            Require.positive("test base-one resistor", baseOneOhms);
        }

        /** Typical where stated, else the minimum, V. */
        public double nominalVolts() {
            return typVolts.orElseGet(minVolts::getAsDouble);
        }
    }

    /**
     * Absolute ratings, each where the sheet states it.
     *
     * @param interbaseVolts base two above base one, V
     * @param emitterPeakAmps peak emitter current, A
     * @param emitterRmsAmps rms emitter current, A
     * @param emitterReverseVolts base two above emitter, V
     * @param capacitorFarads largest capacitor that the peak current rating holds for, F
     * @param capacitorVolts voltage that goes with it, V
     * @param watts dissipation at 25 °C, W
     * @param deratingWattsPerKelvin what the dissipation loses above 25 °C, W/K
     */
    public record Limits(
            OptionalDouble interbaseVolts,
            OptionalDouble emitterPeakAmps,
            OptionalDouble emitterRmsAmps,
            OptionalDouble emitterReverseVolts,
            OptionalDouble capacitorFarads,
            OptionalDouble capacitorVolts,
            OptionalDouble watts,
            OptionalDouble deratingWattsPerKelvin) {}

    /** @throws IllegalArgumentException outside the stated ranges */
    public Unijunction {
        Require.fraction("standoff ratio", standoff.nominal());
        Require.positive("interbase resistance", interbaseOhms.nominal());
        Require.notNegative("emitter diode drop", emitterDropVolts.nominal());
        Require.notNegative("peak-point current", peakCurrentAmps.nominal());
    }

    /** The same device with another base-one pulse, which its emitter line is calibrated on. */
    public Unijunction withBaseOnePulse(Optional<BaseOnePulse> newBaseOnePulse) {
        return new Unijunction(
                id,
                standoff,
                interbaseOhms,
                interbaseDriftPerKelvin,
                emitterDropVolts,
                emitterDriftVoltsPerKelvin,
                peakCurrentAmps,
                valley,
                saturation,
                modulated,
                newBaseOnePulse,
                limits);
    }
}
