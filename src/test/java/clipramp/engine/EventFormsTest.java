package clipramp.engine;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import clipramp.engine.DrawnPieces.Begun;
import java.util.List;
import java.util.function.BiConsumer;
import org.junit.jupiter.api.Test;

/** Every event's form against what a meter would read: how far the circuit is past that event, V or A. */
class EventFormsTest {
    private static void each(BiConsumer<Begun, Kirchhoff> judge) {
        for (long seed = 0; seed < 60; seed++) {
            for (Begun b : List.of(DrawnPieces.direct(seed), DrawnPieces.throughTransformer(seed))) {
                b.piece().look((b.fromSeconds() + b.toSeconds()) / 2);
                judge.accept(b, Kirchhoff.where(b.n(), b.piece()));
            }
        }
    }

    private static void assertReads(Begun b, Affine form, double past) {
        assertThat(b.piece().value(form)).as(b.toString()).isCloseTo(past, within(1e-9));
    }

    @Test
    void aSwitchIsPastItsEventByWhatItIsOverItsEdge() {
        Affine form = new Affine();
        each((b, nodes) -> {
            EventForms.rectifier(b.piece(), form);
            double feeds = nodes.sourceVolts - nodes.supplyVolts;
            assertReads(b, form, b.piece().rectifies ? -feeds : feeds);
            EventForms.zener(b.n(), b.piece(), form);
            double over = nodes.supplyVolts - b.n().zenerKneeVolts;
            assertReads(b, form, b.piece().clips ? -over : over);
            EventForms.gate(b.n(), b.piece(), form);
            double opens = nodes.gateVolts - b.n().gateKneeVolts;
            assertReads(b, form, b.piece().gateConducts ? -opens : opens);
        });
    }

    @Test
    void theDeviceIsPastItsEventByVoltsOfTheRampOrAmpsOfTheEmitter() {
        Affine form = new Affine();
        each((b, nodes) -> {
            if (b.piece().mode == Mode.OFF) {
                EventForms.peak(b.piece(), form);
                assertReads(b, form, nodes.rampVolts - nodes.peakVolts);
            }
            EventForms.valley(b.n(), b.piece(), form);
            assertReads(b, form, b.n().valleySiemens * nodes.supplyVolts - nodes.emitterAmps);
            EventForms.peakCurrent(b.n(), b.piece(), form);
            assertReads(b, form, nodes.emitterAmps - b.n().peakCurrentAmps);
        });
    }

    @Test
    void theGateCurrentIsPastALevelByVoltsAcrossTheJunction() {
        Affine form = new Affine();
        each((b, nodes) -> {
            EventForms.gateFallsTo(b.n(), b.piece(), 5e-3, form);
            assertReads(b, form, b.n().gateKneeVolts + 5e-3 * b.n().gateSlopeOhms - nodes.gateVolts);
        });
    }
}
