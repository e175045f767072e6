package clipramp.files;

import clipramp.circuit.ClipSupply;
import clipramp.circuit.GateDrive;
import clipramp.circuit.Load;
import clipramp.circuit.Snubber;
import clipramp.circuit.Soundness;
import clipramp.circuit.Soundness.Reason;
import clipramp.circuit.Stage;
import clipramp.circuit.Thyristor;
import java.util.List;
import java.util.Optional;

/** Puts lines to the reasons why a combination cannot work. */
final class SoundnessCheck {
    private final Scope root;
    private final Findings findings;

    SoundnessCheck(Scope root, Findings findings) {
        this.root = root;
        this.findings = findings;
    }

    void check(
            Optional<Stage> stage,
            Optional<ClipSupply> clip,
            Optional<GateDrive> gate,
            Optional<Load> load,
            Optional<Thyristor> thyristor,
            Optional<Snubber> snubber) {
        if (stage.isEmpty()) {
            return;
        }
        clip.ifPresent(c -> add(Soundness.ofSupply(stage.get(), c)));
        if (clip.isPresent() && gate.isPresent()) {
            add(Soundness.ofCoupling(stage.get(), clip.get(), gate.get()));
        }
        load.ifPresent(l -> add(Soundness.ofLoad(stage.get(), l, snubber, thyristor.map(Thyristor::device))));
        thyristor.ifPresent(t -> add(Soundness.ofDevice(stage.get(), t.device().kind())));
    }

    private void add(List<Reason> reasons) {
        for (Reason reason : reasons) {
            Place place = root.placeOfPath(reason.key());
            findings.add(new Problem(
                    place.file(),
                    place.line(),
                    place.column(),
                    reason.key(),
                    reason.value(),
                    reason.remedy(),
                    "",
                    reason.sentence()));
        }
    }
}
