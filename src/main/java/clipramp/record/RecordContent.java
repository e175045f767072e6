package clipramp.record;

import clipramp.circuit.RefusedCircuit;
import clipramp.faults.FaultSheet;
import clipramp.faults.Faults;
import clipramp.figures.Lanes;
import clipramp.files.LoadedDesign;
import clipramp.files.Profile;
import clipramp.files.ProfileLibrary;
import clipramp.firing.Firing;
import clipramp.firing.Waveforms;
import clipramp.fit.FitResult;
import clipramp.margins.Check;
import clipramp.power.KnobMap;
import clipramp.power.LoadWave;
import clipramp.power.OperatingPoint;
import clipramp.spread.SpreadResult;
import java.util.List;
import java.util.Optional;

/**
 * Everything that a record prints, solved and judged beforehand.
 *
 * @param loaded the design as read
 * @param check the design solved and judged
 * @param profiles the profiles that were used, with the source of every figure
 * @param lanes the half cycle at mid-knob, or of the fixed ramp
 * @param commissioning what to measure, with what is expected
 * @param faults every single fault and what follows from it
 * @param programVersion version of this program
 * @param fit one unit as built, where it was measured
 * @param spread what many units do, if they were drawn
 */
public record RecordContent(
        LoadedDesign loaded,
        Check check,
        List<Profile> profiles,
        Lanes lanes,
        List<Expectation> commissioning,
        FaultSheet faults,
        String programVersion,
        Optional<FitResult> fit,
        Optional<SpreadResult> spread) {
    private static final int SAMPLES = 2000;
    private static final double MID_KNOB = 0.5;

    /** Keeps the lists as they are. */
    public RecordContent {
        profiles = List.copyOf(profiles);
        commissioning = List.copyOf(commissioning);
    }

    /** The same with a page on what many units of this design do, where they were drawn. */
    public RecordContent withSpread(Optional<SpreadResult> drawn) {
        return new RecordContent(loaded, check, profiles, lanes, commissioning, faults, programVersion, fit, drawn);
    }

    /**
     * Solves what a record prints beyond the check: the half cycle at mid-knob, how far good units may read
     * apart, and what single faults do.
     *
     * @param loaded the design as read
     * @param check the same design judged
     * @param library where its profiles were found, for their sources
     * @param programVersion version of this program
     * @throws RefusedCircuit where the circuit cannot be solved
     */
    public static RecordContent of(LoadedDesign loaded, Check check, ProfileLibrary library, String programVersion) {
        OperatingPoint middle = KnobMap.at(check.design(), check.condition(), MID_KNOB);
        Waveforms waves = Firing.waveforms(check.design(), check.condition(), middle.rampOhms(), SAMPLES);
        LoadWave load = LoadWave.of(check.design(), check.condition(), middle.solution());
        Lanes lanes = new Lanes(
                waves,
                load.rad(),
                load.volts(),
                middle.solution().shown().firingRad(),
                check.condition().lineHertz());
        List<Profile> profiles = loaded.profiles().stream()
                .flatMap(use -> library.find(use.kind(), use.id()).stream())
                .map(Profile::read)
                .toList();
        FaultSheet faults = Faults.of(check.design(), check.condition());
        return new RecordContent(
                loaded,
                check,
                profiles,
                lanes,
                Commissioning.of(check),
                faults,
                programVersion,
                Optional.empty(),
                Optional.empty());
    }

    /** The same with a page about one unit as built. */
    public RecordContent withFit(FitResult measured) {
        return new RecordContent(
                loaded, check, profiles, lanes, commissioning, faults, programVersion, Optional.of(measured), spread);
    }
}
