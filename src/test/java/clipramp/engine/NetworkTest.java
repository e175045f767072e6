package clipramp.engine;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;

/** What a network's numbers amount to with the device off, against the books. */
class NetworkTest {
    private static Network bar(double standoff, double barOhms, double baseOneOhms, double baseTwoOhms) {
        Network n = new Network();
        n.standoff = standoff;
        n.interbaseOhms = barOhms;
        n.baseOneOhms = baseOneOhms;
        n.baseTwoOhms = baseTwoOhms;
        n.emitterDropVolts = 0.7;
        n.gateSlopeOhms = 10;
        return n;
    }

    /** Mehta, Principles of Electronics, 21.7: eta 0.6 and R_BB 10 k split 6 k to 4 k; without R1, R2 kappa is eta. */
    @Test
    void aBareBarDividesByItsStandoffRatio() {
        Network n = bar(0.6, 10e3, 1e-9, 0);
        n.derive();
        assertThat(n.peakShare()).isCloseTo(0.6, within(1e-12));
        assertThat(n.standingSiemens()).isCloseTo(1e-4, within(1e-15));
        assertThat(n.quiescentShare()).isCloseTo(0, within(1e-12));
    }

    /** Gupta and Singhal, Power Electronics, 2.31, exactly: 105.42 ohm at 12 V, 5.6 k and 1.32 k leave 0.18 V. */
    @Test
    void baseOneStandsAtTheBooksVoltage() {
        Network n = bar(0.63, 5600, 105.42, 1320);
        n.derive();
        assertThat(12 * n.quiescentShare()).isCloseTo(0.18, within(1e-4));
        assertThat(n.standingSiemens()).isCloseTo(1 / (5600 + 1320 + 105.42), within(1e-15));
        assertThat(n.peakShare()).isCloseTo((105.42 + 0.63 * 5600) / (5600 + 1320 + 105.42), within(1e-12));
    }

    @Test
    void theGateNetworkStandsAcrossR1() {
        Network n = bar(0.63, 5600, 100, 1320);
        n.gateSeriesOhms = 22;
        n.gateShuntSiemens = 1 / 978.;
        n.derive();
        double parallel = 100 * 1000 / 1100.;
        assertThat(n.quiescentShare()).isCloseTo(parallel / (5600 + 1320 + parallel), within(1e-12));
    }

    /** A primary of 100 ohm across 100 ohm: to direct current its inductance is a short. */
    @Test
    void thePrimarysResistanceStandsAcrossR1() {
        Network n = bar(0.63, 5600, 100, 1320);
        n.transformerCoupled = true;
        n.primaryOhms = 100;
        n.gateShuntSiemens = 1e-3;
        n.derive();
        assertThat(n.quiescentShare()).isCloseTo(50 / (5600 + 1320 + 50.), within(1e-12));
        assertThat(n.peakShare()).isCloseTo((50 + 0.63 * 5600) / (5600 + 1320 + 50.), within(1e-12));
    }

    /** Rashid, Power Electronics 4e, 9.6: 60 k over 30 k is a third. */
    @Test
    void aDividerDivides() {
        Network n = new Network();
        n.programmable = true;
        n.upperOhms = 60e3;
        n.lowerOhms = 30e3;
        n.gateSlopeOhms = 10;
        n.derive();
        assertThat(n.peakShare()).isCloseTo(1 / 3., within(1e-12));
        assertThat(n.standingSiemens()).isCloseTo(1 / 90e3, within(1e-18));
        assertThat(n.quiescentShare()).isZero();
    }

    /** A supply at -0.8 V draws the ramp down to V_P of it at once, 0.7 V - 0.6 x 0.8 V, then with R C towards -0.8 V. */
    @Test
    void aReversedSupplyEmptiesTheRamp() {
        Network n = bar(0.6, 10e3, 1e-9, 0);
        n.reverseVolts = 0.8;
        n.rampOhms = 10e3;
        n.capacitorFarads = 1e-7;
        n.derive();
        assertThat(n.rampUnderReverse(5, 0)).isCloseTo(0.22, within(1e-9));
        assertThat(n.rampUnderReverse(5, 1e-3)).isCloseTo(1.02 * Math.exp(-1) - 0.8, within(1e-9));
        assertThat(n.rampUnderReverse(0.1, 2e-3)).isCloseTo(0.9 * Math.exp(-2) - 0.8, within(1e-9));
    }
}
