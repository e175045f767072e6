package clipramp.desk.model;

import clipramp.files.LoadedDesign;
import clipramp.fit.FitResult;
import clipramp.margins.Check;
import clipramp.margins.Judge;
import clipramp.record.DesignRecord;
import clipramp.record.PageSize;
import clipramp.record.RecordContent;
import clipramp.record.RecordPreview;
import clipramp.spread.SpreadResult;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.concurrent.atomic.AtomicInteger;
import java.util.function.Consumer;

/** Lays the record out, and draws its pages one after the other; a newer design makes it begin again. */
public final class RecordMaker {
    /** Sharp enough to read on a screen at 100 %. */
    private static final double PIXELS_PER_POINT = 1.25;

    private record Asked(
            LoadedDesign loaded,
            Optional<Path> file,
            PageSize size,
            Optional<SpreadResult> spread,
            Optional<FitResult> fit,
            double zoom,
            int turn) {}

    private record Made(Asked asked, byte[] pdf) {}

    private final Workers workers;
    private final Workshop workshop;
    private final String version;
    private final LatestWins<Asked, Made> maker;
    private final List<RecordPreview.Page> pages = new ArrayList<>();
    private final List<Runnable> listeners = new ArrayList<>();
    private PageSize size = PageSize.A4;
    private Optional<SpreadResult> spread = Optional.empty();
    private double zoom = 1;
    private Optional<FitResult> fit = Optional.empty();
    private Optional<Asked> wanted = Optional.empty();
    private Optional<Made> made = Optional.empty();
    private final AtomicInteger turn = new AtomicInteger();

    /**
     * @param workers where work is done
     * @param workshop where profiles are found
     * @param version version of this program
     * @param troubles takes what went wrong
     */
    public RecordMaker(Workers workers, Workshop workshop, String version, Consumer<Trouble> troubles) {
        this.workers = workers;
        this.workshop = workshop;
        this.version = version;
        this.maker = new LatestWins<>(
                this::make,
                workers.judging(),
                workers.home(),
                this::take,
                failure -> troubles.accept(Trouble.of("The record could not be laid out", failure)));
    }

    /** Told whenever there is more or less to see. */
    public void onChange(Runnable listener) {
        listeners.add(listener);
    }

    /** Asks for the record of a design. */
    public void show(LoadedDesign loaded, Optional<Path> file) {
        boolean same = wanted.filter(w -> w.loaded().equals(loaded)
                        && w.size() == size
                        && w.spread().equals(spread)
                        && w.fit().equals(fit)
                        && w.zoom() == zoom)
                .isPresent();
        if (!same) {
            ask(loaded, file);
        }
    }

    private void ask(LoadedDesign loaded, Optional<Path> file) {
        Asked asked = new Asked(loaded, file, size, spread, fit, zoom, turn.incrementAndGet());
        wanted = Optional.of(asked);
        maker.ask(asked);
        listeners.forEach(Runnable::run);
    }

    /** Chooses the paper; a record that was asked for is laid out anew. */
    public void setSize(PageSize other) {
        size = other;
        wanted.ifPresent(w -> show(w.loaded(), w.file()));
    }

    /** Adds a page about one unit as built, or leaves it out. */
    public void setFit(Optional<FitResult> measured) {
        fit = measured;
        wanted.ifPresent(w -> show(w.loaded(), w.file()));
    }

    /** Lays a page on what many units do into the record, or leaves it out; takes effect with the next {@link #show}. */
    public void setSpread(Optional<SpreadResult> drawn) {
        spread = drawn;
    }

    /** Draws the pages for a zoom of the window, above 0; 1 is 100 %. */
    public void setZoom(double other) {
        zoom = other;
        wanted.ifPresent(w -> show(w.loaded(), w.file()));
    }

    /** The record holds for every condition, whatever the window shows. */
    private Made make(Asked asked) {
        try {
            Check check = Judge.check(asked.loaded().design(), OptionalDouble.empty(), OptionalDouble.empty());
            RecordContent content = RecordContent.of(asked.loaded(), check, workshop.library(asked.file()), version)
                    .withSpread(asked.spread());
            RecordContent whole = asked.fit().map(content::withFit).orElse(content);
            return new Made(asked, DesignRecord.bytes(whole, asked.size()));
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    private void take(Made answer) {
        made = Optional.of(answer);
        pages.clear();
        listeners.forEach(Runnable::run);
        workers.judging().execute(() -> draw(answer));
    }

    private void draw(Made answer) {
        try {
            RecordPreview.draw(answer.pdf(), PIXELS_PER_POINT * answer.asked().zoom(), page -> {
                workers.home().execute(() -> add(answer, page));
                return answer.asked().turn() == turn.get();
            });
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    private void add(Made answer, RecordPreview.Page page) {
        if (made.equals(Optional.of(answer))) {
            pages.add(page);
            listeners.forEach(Runnable::run);
        }
    }

    /** The record's bytes, if they are those of the design last asked for. */
    public Optional<byte[]> pdf() {
        return made.filter(m -> wanted.equals(Optional.of(m.asked()))).map(Made::pdf);
    }

    /** Pages drawn so far. */
    public List<RecordPreview.Page> pages() {
        return List.copyOf(pages);
    }

    /** Whether more pages are to come. */
    public boolean isBusy() {
        return maker.isBusy()
                || pdf().isEmpty()
                || pages.isEmpty()
                || pages.size() < pages.get(0).count();
    }
}
