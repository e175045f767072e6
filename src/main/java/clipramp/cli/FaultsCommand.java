package clipramp.cli;

import clipramp.circuit.Condition;
import clipramp.faults.Diagnosis;
import clipramp.faults.FaultSheet;
import clipramp.faults.Faults;
import clipramp.faults.Observation;
import clipramp.faults.ObservationReader;
import clipramp.faults.RefusedObservationException;
import clipramp.files.LoadedDesign;
import java.util.ArrayList;
import java.util.List;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;

/** Single faults, forwards and backwards. */
@Command(
        name = "faults",
        sortOptions = false,
        sortSynopsis = false,
        description = {
            "Every part open, shorted, drifted or dead in turn: what the load gets, what each test point reads with the"
                    + " knob in the middle, what is over its rating and burns next.",
            "With --seen the faults that fit what was seen, best first."
        })
final class FaultsCommand extends Analysis {
    @Option(
            names = "--seen",
            paramLabel = "WHAT",
            order = 10,
            description =
                    "what was seen, such as load:full,TP1=20V; " + ObservationReader.GRAMMAR + "; may be repeated")
    List<String> seen = new ArrayList<>();

    @Option(
            names = "--meters",
            order = 11,
            description = "every test point on every meter: dc, true-rms ac, oscilloscope peak")
    boolean meters;

    @Option(names = "--json", order = 12, description = "the answer for machines")
    boolean json;

    FaultsCommand(Session session) {
        super(session);
    }

    @Override
    public Integer call() {
        LoadedDesign loaded = design.load(session);
        List<Observation> observations = observations(loaded);
        Condition condition = design.condition(loaded.design());
        FaultSheet sheet = Faults.of(loaded.design(), condition);
        List<Diagnosis.Candidate> ranked = observations.isEmpty() ? List.of() : Diagnosis.rank(sheet, observations);
        if (json) {
            session.out().exactly(FaultsJson.of(loaded, sheet, observations, ranked, session.ascii()));
        } else {
            new FaultsText(session.out(), loaded, sheet).print(ranked, meters);
        }
        return ExitCode.ANSWERED;
    }

    private List<Observation> observations(LoadedDesign loaded) {
        ObservationReader reader = new ObservationReader(loaded.design());
        List<Observation> all = new ArrayList<>();
        for (String text : seen) {
            try {
                all.addAll(reader.read(text));
            } catch (RefusedObservationException refused) {
                throw Problems.refused("--seen", String.valueOf(refused.getMessage()));
            }
        }
        return all;
    }
}
