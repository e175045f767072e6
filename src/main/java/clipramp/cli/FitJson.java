package clipramp.cli;

import clipramp.files.LoadedDesign;
import clipramp.fit.FitResult;
import clipramp.fit.Fitted;
import clipramp.fit.Quality;
import clipramp.fit.Residual;
import clipramp.margins.Note;
import clipramp.units.Unit;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.jspecify.annotations.Nullable;

/** A fit for machines: SI units, angles in degrees, shares 0..1. */
final class FitJson {
    private FitJson() {}

    static String of(
            LoadedDesign loaded,
            FitResult result,
            List<String> notes,
            String digest,
            @Nullable String written,
            boolean ascii) {
        List<Note> all = new ArrayList<>(Answer.readerNotes(loaded));
        notes.forEach(text -> all.add(new Note("fit", text)));
        return new Answer("fit", Optional.of(loaded), Optional.empty(), all).json(ascii, json -> {
            Answer.titleAndCondition(json, loaded, FitText.condition(loaded, result));
            json.put("readings", result.readings().name())
                    .put("readingsDigest", digest)
                    .putObjects("values", result.values(), FitJson::value)
                    .putWords("untouched", result.untouched())
                    .putObjects(
                            "together",
                            result.together(),
                            (t, pair) -> t.put("first", pair.first())
                                    .put("second", pair.second())
                                    .put("correlation", pair.correlation()))
                    .putObjects("residuals", result.residuals(), FitJson::residual)
                    .putObject("quality", q -> quality(q, result.quality()))
                    .put("written", written);
        });
    }

    private static void value(Json json, Fitted value) {
        json.put("path", value.path())
                .put("name", value.name())
                .put("unit", unit(value.unit()))
                .put("design", value.nominal())
                .put("low", value.low())
                .put("high", value.high())
                .put("limitsAssumed", value.limitsAssumed())
                .put("asBuilt", value.value())
                .put("from", value.from())
                .put("to", value.to())
                .put("difference", value.difference())
                .put("kept", value.kept())
                .put("knowledge", word(value.knowledge().word()))
                .put("tolerance", word(value.within().word()));
    }

    private static String word(String words) {
        return words.replace(' ', '-');
    }

    private static String unit(Unit unit) {
        return switch (unit) {
            case ANGLE -> "deg";
            case FRACTION -> "";
            case PER_KELVIN -> "1/K";
            default -> unit.symbol();
        };
    }

    private static void residual(Json json, Residual residual) {
        boolean angle = residual.unit() == Unit.ANGLE;
        json.put("line", residual.line())
                .put("column", residual.column())
                .put("what", residual.what())
                .put("unit", unit(residual.unit()))
                .put("read", angle ? Math.toDegrees(residual.read()) : residual.read())
                .put("fitted", angle ? Math.toDegrees(residual.shown()) : residual.shown())
                .put("deviations", residual.deviations())
                .put("belongs", residual.belongs());
    }

    private static void quality(Json json, Quality quality) {
        json.put("readings", quality.readings())
                .put("used", quality.used())
                .put("squares", quality.squares())
                .put("freedom", quality.freedom())
                .put("chance", quality.chance())
                .put("widened", quality.widened())
                .put("combinationsTold", quality.directions())
                .put("unknowns", quality.unknowns())
                .put("condition", quality.condition());
    }
}
