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

    /** What the parts bear over half cycles of the periodic state, the first of which has the running number 0. */
    static Dissipation of(FiringCase firing, List<List<PieceLog.Entry>> halves) {
        Bearing sums = new Bearing(firing.network());
        double seconds = 0;
        for (int h = 0; h < halves.size(); h++) {
            for (PieceLog.Entry entry : halves.get(h)) {
                Piece piece = entry.piece();
                PieceQuadrature.visit(piece, entry.fromSeconds(), entry.toSeconds(), sums::add);
                sums.peaksAt(piece, entry.fromSeconds());
                sums.peaksAt(piece, entry.toSeconds());
            }
            seconds += firing.timing().wave(h).seconds();
        }
        return sums.over(seconds);
    }

    private void add(Piece p, double weight) {
        double supply = p.supplyVolts();
        double base = p.baseOneVolts();
        double dropperAmps = p.dropperAmps(n);
        double zenerAmps = p.zenerAmps(n);
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
        peaks(p, base, baseTwoVolts);
    }

    private void peaksAt(Piece piece, double time) {
        piece.look(time);
        peaks(piece, piece.baseOneVolts(), piece.baseTwoVolts(n));
    }

    private void peaks(Piece p, double base, double baseTwoVolts) {
        dropperPeakVolts = Math.max(dropperPeakVolts, p.dropperAmps(n) * n.dropperOhms);
        zenerPeakAmps = Math.max(zenerPeakAmps, p.zenerAmps(n));
        emitterPeakAmps = Math.max(emitterPeakAmps, p.emitterAmps());
        emitterReverseVolts = Math.max(emitterReverseVolts, baseTwoVolts - p.rampVolts());
        interbaseVolts = Math.max(interbaseVolts, baseTwoVolts - base);
        capacitorVolts = Math.max(capacitorVolts, p.rampVolts());
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
