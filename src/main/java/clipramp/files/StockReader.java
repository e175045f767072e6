package clipramp.files;

import clipramp.circuit.Design;
import clipramp.circuit.Stage;
import clipramp.circuit.ThyristorDevice;
import clipramp.circuit.Trigger.UnijunctionTrigger;
import clipramp.circuit.Unijunction;
import clipramp.circuit.Zener;
import clipramp.files.DesignText.Reading;
import clipramp.sizing.OpenPart;
import clipramp.sizing.Stock;
import java.util.List;
import java.util.Set;
import java.util.function.Function;
import java.util.stream.Stream;

/** Reads the devices that a library has, each in the place that it is wanted for. One that cannot be read is left out. */
final class StockReader {
    private final DesignText text;
    private final ProfileLibrary library;

    StockReader(DesignText text, ProfileLibrary library) {
        this.text = text;
        this.library = library;
    }

    /** Devices of the places that are open; the other lists stay empty. */
    Stock read(Set<OpenPart> open) {
        boolean triac = text.valueAt("stage").filter(Stage.TRIAC.word()::equals).isPresent();
        boolean unijunction = text.valueAt("trigger.base-two").isPresent();
        List<Unijunction> unijunctions = open.contains(OpenPart.TRIGGER_DEVICE) && unijunction
                ? devices("unijunction", OpenPart.TRIGGER_DEVICE, d -> ((UnijunctionTrigger) d.trigger()).device())
                : List.of();
        List<ThyristorDevice> thyristors = open.contains(OpenPart.THYRISTOR)
                ? devices(
                        triac ? "triac" : "scr",
                        OpenPart.THYRISTOR,
                        d -> d.thyristor().device())
                : List.of();
        List<Zener> zeners = open.contains(OpenPart.ZENER)
                ? devices("zener", OpenPart.ZENER, d -> d.clip().zener())
                : List.of();
        return new Stock(unijunctions, thyristors, zeners);
    }

    private <T> List<T> devices(String kind, OpenPart place, Function<Design, T> device) {
        return library.ids(kind).stream()
                .flatMap(id -> text.read(List.of(place.key() + "=" + id), library) instanceof Reading.Good good
                        ? Stream.of(device.apply(good.loaded().design()))
                        : Stream.empty())
                .toList();
    }
}
