package clipramp.firing;

import clipramp.engine.Network;
import clipramp.engine.Piece;
import clipramp.engine.PieceQuadrature;
import java.util.List;

/** Sums up what the parts bear over the logged pieces. */
final class Bearing {
    private final Network n;
    private double dropper;
    private double zener;
    private double baseOne;
    private double baseTwo;
    private double lower;
    private double ramp;
    private double device;
    private double emitterSquared;
    private double gate;
    private double gateSeries;
    private double gateShunt;
    private double dropperPeakVolts;
    private double zenerPeakAmps;
    private double emitterPeakAmps;
    private double emitterReverseVolts;
    private double interbaseVolts;
    private double capacitorVolts;

    private Bearing(Network network) {
        n = network;
    }

    static Dissipation of(FiringCase firing, List<List<PieceLog.Entry>> halves, int firstHalf) {
        Bearing sums = new Bearing(firing.network());
        double seconds = 0;
        for (int h = 0; h < halves.size(); h++) {
            for (PieceLog.Entry entry : halves.get(h)) {
                Piece piece = entry.piece();
                PieceQuadrature.visit(piece, entry.fromSeconds(), entry.toSeconds(), sums::add);
                sums.peaksAt(piece, entry.fromSeconds());
                sums.peaksAt(piece, entry.toSeconds());
            }
            seconds += firing.timing().wave(firstHalf + h).seconds();
        }
        return sums.over(seconds);
    }

    private void add(Piece p, double weight) {
        double supply = p.supplyVolts();
        double base = p.baseOneVolts();
        double dropperAmps = dropperAmps(p, supply);
        double zenerAmps = zenerAmps(p, supply);
        double baseTwoAmps = p.baseTwoAmps(n);
        double emitterAmps = p.emitterAmps();
        double gateVolts = p.gateVolts();
        double gateAmps = p.gateAmps(n);
        double networkAmps = gateAmps + gateVolts * n.gateShuntSiemens;
        dropper += weight * dropperAmps * dropperAmps * n.dropperOhms;
        zener += weight * supply * zenerAmps;
        baseOne += weight * base * base / n.baseOneOhms;
        double baseTwoVolts = p.baseTwoVolts(n);
        double lowerAmps = n.programmable ? baseTwoVolts / n.lowerOhms : 0;
        double intoDevice = baseTwoAmps - lowerAmps;
        baseTwo += weight * baseTwoAmps * (supply - baseTwoVolts);
        lower += weight * lowerAmps * baseTwoVolts;
        ramp += weight * Math.pow(supply - p.rampVolts(), 2) / n.rampOhms;
        device +=
                weight * (p.rampVolts() * emitterAmps + baseTwoVolts * intoDevice - base * (emitterAmps + intoDevice));
        emitterSquared += weight * emitterAmps * emitterAmps;
        gate += weight * gateAmps * gateVolts;
        gateSeries += weight * networkAmps * networkAmps * n.gateSeriesOhms;
        gateShunt += weight * gateVolts * gateVolts * n.gateShuntSiemens;
        peaks(p, supply, base, baseTwoVolts);
    }

    private void peaksAt(Piece piece, double time) {
        piece.look(time);
        peaks(piece, piece.supplyVolts(), piece.baseOneVolts(), piece.baseTwoVolts(n));
    }

    private void peaks(Piece p, double supply, double base, double baseTwoVolts) {
        dropperPeakVolts = Math.max(dropperPeakVolts, dropperAmps(p, supply) * n.dropperOhms);
        zenerPeakAmps = Math.max(zenerPeakAmps, zenerAmps(p, supply));
        emitterPeakAmps = Math.max(emitterPeakAmps, p.emitterAmps());
        emitterReverseVolts = Math.max(emitterReverseVolts, baseTwoVolts - p.rampVolts());
        interbaseVolts = Math.max(interbaseVolts, baseTwoVolts - base);
        capacitorVolts = Math.max(capacitorVolts, p.rampVolts());
    }

    private double dropperAmps(Piece p, double supply) {
        return p.isRectifying() ? (p.sourceVolts() - supply) / n.dropperOhms : 0;
    }

    private double zenerAmps(Piece p, double supply) {
        return p.isClipping() ? (supply - n.zenerKneeVolts) / n.zenerSlopeOhms : 0;
    }

    private Dissipation over(double seconds) {
        return new Dissipation(
                dropper / seconds,
                dropperPeakVolts,
                zener / seconds,
                zenerPeakAmps,
                baseOne / seconds,
                baseTwo / seconds,
                lower / seconds,
                ramp / seconds,
                device / seconds,
                Math.sqrt(emitterSquared / seconds),
                emitterPeakAmps,
                emitterReverseVolts,
                interbaseVolts,
                capacitorVolts,
                gate / seconds,
                gateSeries / seconds,
                gateShunt / seconds);
    }
}
