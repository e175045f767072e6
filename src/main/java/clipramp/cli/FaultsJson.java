package clipramp.cli;

import clipramp.circuit.TestPoint;
import clipramp.faults.Burden;
import clipramp.faults.Diagnosis;
import clipramp.faults.Fault;
import clipramp.faults.FaultEffect;
import clipramp.faults.FaultSheet;
import clipramp.faults.LoadAt;
import clipramp.faults.Observation;
import clipramp.faults.Reading;
import clipramp.files.LoadedDesign;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;

/** Faults for machines. */
final class FaultsJson {
    private FaultsJson() {}

    static String of(
            LoadedDesign loaded,
            FaultSheet sheet,
            List<Observation> seen,
            List<Diagnosis.Candidate> ranked,
            boolean ascii) {
        return new Answer("faults", Optional.of(loaded), Optional.empty(), Answer.readerNotes(loaded))
                .json(ascii, json -> {
                    Answer.titleAndCondition(json, loaded, sheet.condition());
                    json.put("caution", Caution.LINE);
                    json.putObject("healthy", h -> effect(h, sheet.healthy()));
                    json.putObjects("faults", sheet.faults(), FaultsJson::effect);
                    json.putObjects("notComputed", sheet.notComputed(), (n, one) -> {
                        fault(n, one.fault());
                        n.put("reason", one.reason());
                    });
                    json.putWords("seen", seen.stream().map(Observation::text).toList());
                    json.putObjects("ranked", ranked, FaultsJson::candidate);
                });
    }

    private static void fault(Json json, Fault fault) {
        json.put("id", fault.id())
                .put("part", fault.part())
                .put("how", fault.how().word())
                .put("words", fault.words());
    }

    private static void effect(Json json, FaultEffect effect) {
        fault(json, effect.fault());
        json.put("load", effect.gets().word()).put("knobActs", effect.knobActs());
        json.putObjects("knob", effect.knob(), FaultsJson::loadAt);
        Map<TestPoint, Reading> readings = new TreeMap<>(effect.readings());
        json.putObjects(
                "readings",
                readings.entrySet(),
                (r, entry) -> r.put("at", entry.getKey().name())
                        .put("dcVolts", entry.getValue().dcVolts())
                        .put("acVolts", entry.getValue().acVolts())
                        .put("peakVolts", entry.getValue().peakVolts()));
        json.putObjects("over", effect.over(), FaultsJson::burden);
        json.putWords("remarks", effect.remarks());
    }

    private static void loadAt(Json json, LoadAt at) {
        json.put("position", at.position())
                .put("rampOhms", at.rampOhms())
                .put("firingDeg", Math.toDegrees(at.firingRad().orElse(Double.NaN)))
                .put("loadWatts", at.watts())
                .put("powerFraction", at.fraction())
                .put("dcAmps", at.dcAmps());
    }

    private static void burden(Json json, Burden burden) {
        json.put("part", burden.part())
                .put("rating", burden.what())
                .put("unit", burden.unit().symbol())
                .put("borne", burden.borne())
                .put("rated", burden.rating())
                .put("ratio", burden.ratio());
    }

    private static void candidate(Json json, Diagnosis.Candidate candidate) {
        fault(json, candidate.effect().fault());
        json.putWords("fits", candidate.fits().stream().map(Observation::text).toList());
        json.putObjects(
                "contradicts",
                candidate.contradicts(),
                (c, one) -> c.put("seen", one.seen().text()).put("instead", one.instead()));
    }
}
