package clipramp.record;

import clipramp.files.LoadedDesign;
import clipramp.files.Profile;
import clipramp.margins.Note;
import java.util.ArrayList;
import java.util.List;

/** Where the figures come from: what was assumed, what the model leaves out here, and every profile with its sources. */
final class SourcesSection {
    private static final int DIGEST_SHOWN = 16;

    private SourcesSection() {}

    static void write(Paper paper, RecordContent content) {
        paper.section("Sources and assumptions");
        LoadedDesign loaded = content.loaded();
        paper.text(
                "Circuit laws: this program's own piecewise-linear model, described in its DEVELOPERS.md; letter symbols"
                        + " after IEC 60747-6, circuit symbols after IEC 60617.");
        paper.heading("Assumed, because the design says nothing");
        assumed(paper, loaded);
        if (!loaded.overrides().isEmpty()) {
            paper.heading("Overrides");
            paper.list(loaded.overrides(), paper.faces().small());
        }
        paper.heading("Notes");
        List<String> notes = new ArrayList<>(loaded.notes());
        content.check().notes().stream().map(Note::text).forEach(notes::add);
        paper.list(notes, paper.faces().small());
        for (LoadedDesign.ProfileUse use : loaded.profiles()) {
            profile(paper, content, use);
        }
    }

    private static void assumed(Paper paper, LoadedDesign loaded) {
        if (loaded.assumed().isEmpty()) {
            paper.small("Nothing.");
            return;
        }
        Grid grid = new Grid(paper.faces(), new float[] {3, 6});
        loaded.assumed().forEach(assumed -> grid.row(assumed.path(), assumed.value()));
        paper.add(grid.table());
    }

    private static void profile(Paper paper, RecordContent content, LoadedDesign.ProfileUse use) {
        paper.heading(use.kind() + " " + use.id());
        paper.quiet("from: " + use.from() + "; digest "
                + use.digest().substring(0, Math.min(DIGEST_SHOWN, use.digest().length())) + "…"
                + (use.hides().isEmpty() ? "" : "; hides " + use.hides()));
        Grid grid = new Grid(paper.faces(), new float[] {2.2f, 3.2f, 4.6f});
        grid.heads("figure", "as written", "source");
        boolean any = false;
        for (Profile profile : content.profiles()) {
            if (profile.id().equals(use.id()) && profile.kind().equals(use.kind())) {
                for (Profile.Figure figure : profile.figures()) {
                    grid.row(figure.key(), figure.text(), figure.source());
                    any = true;
                }
            }
        }
        if (any) {
            paper.add(grid.table());
        }
    }
}
