package clipramp.faults;

import clipramp.circuit.Condition;
import clipramp.circuit.Design;
import clipramp.circuit.Stage;
import clipramp.circuit.TestPoint;
import clipramp.circuit.Thyristor;
import clipramp.circuit.ThyristorDevice;
import clipramp.circuit.ThyristorDevice.NonTrigger;
import clipramp.circuit.ThyristorDevice.OnState;
import clipramp.engine.Network;
import clipramp.engine.NetworkOfDesign;
import clipramp.firing.Dissipation;
import clipramp.firing.Firing;
import clipramp.firing.Solution;
import clipramp.firing.Study;
import clipramp.firing.Waveforms;
import clipramp.power.LoadPeriod;
import clipramp.power.LoadPower;
import clipramp.power.LoadResult;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.EnumMap;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import java.util.stream.Stream;

/** Solves a circuit with one fault in it at three knob positions. */
final class FaultSolver {
    private static final int SAMPLES = 400;
    private static final double[] POSITIONS = {0, 0.5, 1};

    /** A rating that the healthy circuit exceeds too counts only if the fault makes it worse by this much. */
    private static final double WORSE = 1.05;

    private final Design design;
    private final Condition condition;
    private final Map<String, Double> healthyRatios = new HashMap<>();

    FaultSolver(Design design, Condition condition) {
        this.design = design;
        this.condition = condition;
    }

    /**
     * One knob position with a fault.
     *
     * @param load what the load gets
     * @param burdens every rating and what is borne of it
     * @param readings what the test points show
     * @param remarks what else to know
     */
    record Setting(LoadAt load, List<Burden> burdens, Map<TestPoint, Reading> readings, List<String> remarks) {}

    /** The circuit without a fault; to be asked for first, since what is worse than there is measured against it. */
    FaultEffect healthy() {
        List<Setting> settings = settings(Fault.NONE);
        settings.stream()
                .flatMap(setting -> setting.burdens().stream())
                .forEach(burden -> healthyRatios.merge(key(burden), burden.ratio(), Math::max));
        List<LoadAt> knob = settings.stream().map(Setting::load).toList();
        return new FaultEffect(
                Fault.NONE,
                LoadGets.AS_BEFORE,
                knob,
                Judgement.knobActs(knob),
                middle(settings).readings(),
                List.of(),
                List.of());
    }

    /** What follows from a fault, held against the healthy circuit. */
    FaultEffect effect(Fault fault, FaultEffect healthy) {
        List<Setting> settings = settings(fault);
        List<LoadAt> knob = settings.stream().map(Setting::load).toList();
        List<String> remarks = new ArrayList<>(fault.remark().isEmpty() ? List.of() : List.of(fault.remark()));
        Stream.concat(Stream.of(middle(settings)), settings.stream())
                .flatMap(setting -> setting.remarks().stream())
                .limit(1)
                .forEach(remarks::add);
        LoadGets gets = Judgement.gets(
                middle(settings).load(),
                healthy.middle(),
                LoadPower.atFiringAngle(design, condition, 0).fraction());
        return new FaultEffect(
                fault, gets, knob, Judgement.knobActs(knob), middle(settings).readings(), over(settings), remarks);
    }

    private static Setting middle(List<Setting> settings) {
        return settings.get(settings.size() / 2);
    }

    private static String key(Burden burden) {
        return burden.part() + " " + burden.what();
    }

    private List<Burden> over(List<Setting> settings) {
        Map<String, Burden> worst = new HashMap<>();
        settings.stream()
                .flatMap(setting -> setting.burdens().stream())
                .filter(Burden::isOver)
                .filter(burden -> burden.ratio() > WORSE * healthyRatios.getOrDefault(key(burden), 0.0))
                .forEach(burden ->
                        worst.merge(key(burden), burden, (one, other) -> one.ratio() >= other.ratio() ? one : other));
        return worst.values().stream()
                .sorted(Comparator.comparingDouble(Burden::ratio).reversed().thenComparing(FaultSolver::key))
                .toList();
    }

    private List<Setting> settings(Fault fault) {
        if (design.ramp().pot().isEmpty()) {
            return List.of(setting(fault, OptionalDouble.empty(), design.ramp().rampOhms(0)));
        }
        List<Setting> settings = new ArrayList<>();
        for (double position : POSITIONS) {
            settings.add(
                    setting(fault, OptionalDouble.of(position), design.ramp().rampOhms(position)));
        }
        return settings;
    }

    private Setting setting(Fault fault, OptionalDouble position, double rampOhms) {
        Design wired = fault.wiring().apply(design);
        Network network = NetworkOfDesign.of(wired, condition, rampOhms);
        fault.change().accept(network);
        if (fault.path() == LoadPath.LINE_SHORTED) {
            return FuseGone.byDiode(fault, position, network.rampOhms);
        }
        Study study = Firing.study(wired, condition, network);
        Waveforms waves = Firing.waveforms(wired, condition, network, SAMPLES);
        StandingGate standing = new StandingGate(wired, network);
        OptionalDouble standingRad = standing.firesAtRad(waves);
        boolean fires = standingRad.isPresent()
                || study.solution().halves().stream()
                        .anyMatch(half -> half.firingRad().isPresent());
        if (fault.path() == LoadPath.LOAD_SHORTED && fires) {
            return FuseGone.byThyristor(design, position, network.rampOhms);
        }
        Power power = power(fault, wired, study.solution(), standingRad);
        return solved(fault, position, wired, network, study, waves, power, standing(fault, wired, standing, waves));
    }

    private Setting solved(
            Fault fault,
            OptionalDouble position,
            Design wired,
            Network network,
            Study study,
            Waveforms waves,
            Power power,
            List<String> remarks) {
        double share = fault.leakShare(network.rampOhms);
        LoadAt load = new LoadAt(
                position,
                network.rampOhms,
                power.firingRad(),
                power.load().watts(),
                power.load().fraction(),
                power.load().rmsAmps(),
                power.load().dcAmps());
        Dissipation bears = ReverseHalf.isIn(network)
                ? ReverseHalf.borne(wired, condition, network, study.dissipation())
                : study.dissipation();
        List<Burden> burdens =
                new ArrayList<>(Ratings.ofFiringCircuit(wired, condition, bears, share, position, network.rampOhms));
        burdens.addAll(Ratings.ofThyristor(wired, power.thyristor()));
        if (fault.path() == LoadPath.WINDING_SHORTED) {
            burdens.add(Burden.unlimited("clip.winding", "its short-circuit current in every second half cycle"));
        }
        return new Setting(load, burdens, readings(network, waves, power, share), remarks);
    }

    /** What load and thyristor get, and what stands across the thyristor. */
    private record Power(LoadResult load, LoadResult thyristor, OptionalDouble firingRad, Reading acrossThyristor) {
        /** Where the thyristor carries what the load does. */
        Power(LoadResult load, OptionalDouble firingRad, Reading acrossThyristor) {
            this(load, load, firingRad, acrossThyristor);
        }
    }

    private Power power(Fault fault, Design wired, Solution solution, OptionalDouble standingRad) {
        switch (fault.path()) {
            case THYRISTOR_SHORTED -> {
                Design shorted = withWireForThyristor(wired);
                return new Power(LoadPower.atFiringAngle(shorted, condition, 0), OptionalDouble.empty(), Reading.ZERO);
            }
            case LOAD_OPEN, LINE_SHORTED -> {
                return new Power(nothing(wired), OptionalDouble.empty(), Reading.ZERO);
            }
            case OTHER_HALF_FREE -> {
                return besides(wired, solution);
            }
            default -> {}
        }
        boolean oneHalf = fault.path() == LoadPath.ONE_HALF || fault.path() == LoadPath.WINDING_SHORTED;
        if (standingRad.isPresent() && !oneHalf) {
            double rad = standingRad.getAsDouble();
            LoadPeriod period = LoadPower.periodAtFiringAngle(wired, condition, rad);
            return new Power(
                    LoadPower.atFiringAngle(wired, condition, rad),
                    standingRad,
                    Meters.acrossThyristor(wired, condition, period, false));
        }
        Solution acting = oneHalf ? solution.firingOnlyPositive() : solution;
        LoadPeriod period = LoadPower.period(wired, condition, acting);
        return new Power(
                LoadPower.of(wired, condition, acting),
                acting.shown().firingRad(),
                Meters.acrossThyristor(wired, condition, period, oneHalf));
    }

    /** One polarity of the load's current flows past the thyristor. */
    private Power besides(Design wired, Solution solution) {
        LoadPeriod period = LoadPower.periodWithNegativeHalvesFree(wired, condition, solution);
        return new Power(
                LoadPower.withNegativeHalvesFree(wired, condition, solution),
                LoadPower.of(wired, condition, solution.firingOnlyPositive()),
                solution.shown().firingRad(),
                Meters.acrossThyristor(wired, condition, period, false));
    }

    private LoadResult nothing(Design wired) {
        return LoadPower.atFiringAngle(wired, condition, Math.PI);
    }

    /** A wire conducts both ways, so a half-wave stage becomes a switch for alternating current. */
    private static Design withWireForThyristor(Design design) {
        ThyristorDevice device = design.thyristor().device();
        Thyristor wire = new Thyristor(
                device.withOnState(new OnState(0, 0)), design.thyristor().caseToAmbientKelvinPerWatt());
        return design.withThyristor(wire).withStage(design.stage() == Stage.HALF_WAVE ? Stage.TRIAC : design.stage());
    }

    private static Map<TestPoint, Reading> readings(Network network, Waveforms waves, Power power, double leakShare) {
        boolean reverse = ReverseHalf.isIn(network);
        double[] supply = reverse ? ReverseHalf.supplyVolts(waves, network) : waves.supplyVolts();
        double[] ramp = reverse ? ReverseHalf.rampVolts(waves, network) : waves.rampVolts();
        Map<TestPoint, Reading> readings = new EnumMap<>(TestPoint.class);
        readings.put(TestPoint.TP1, Meters.of(waves.seconds(), supply));
        readings.put(TestPoint.TP2, Meters.of(waves.seconds(), ramp).times(leakShare));
        readings.put(TestPoint.TP3, Meters.of(waves.seconds(), waves.baseOneVolts()));
        readings.put(TestPoint.TP4, Meters.of(waves.seconds(), waves.gateVolts()));
        readings.put(TestPoint.TP5, power.acrossThyristor());
        return readings;
    }

    /** A standing gate voltage over what the sheet still promises not to fire. */
    private List<String> standing(Fault fault, Design wired, StandingGate gate, Waveforms waves) {
        double supply = 0;
        for (double volts : waves.supplyVolts()) {
            supply = Math.max(supply, volts);
        }
        double volts = gate.volts(supply);
        if (fault.path() != LoadPath.INTACT && fault.path() != LoadPath.ONE_HALF) {
            return List.of();
        }
        if (gate.firesAtRad(waves).isPresent()) {
            return List.of("The current that stands in the gate between pulses, up to " + Said.amps(gate.amps(supply))
                    + ", reaches the trigger current: it fires by itself as soon as the supply is up.");
        }
        OptionalDouble ceiling = wired.thyristor().device().gate().nonTrigger().stream()
                .mapToDouble(NonTrigger::volts)
                .findFirst();
        return ceiling.isPresent() && volts > ceiling.getAsDouble()
                ? List.of("Between pulses the gate stands at up to " + Said.volts(volts) + ", over the "
                        + Said.volts(ceiling.getAsDouble())
                        + " at which a hot thyristor is sure to stay off: it may fire by itself.")
                : List.of();
    }
}
