package clipramp.desk;

import java.io.File;
import java.nio.file.Path;
import java.util.Locale;
import java.util.Optional;
import javafx.stage.FileChooser;
import javafx.stage.Window;

/** Asks by the system's own dialogs. */
final class SystemFileAsk implements FileAsk {
    private final Window owner;

    SystemFileAsk(Window owner) {
        this.owner = owner;
    }

    @Override
    public Optional<Path> toOpen(Kind kind) {
        return Optional.ofNullable(chooser(kind).showOpenDialog(owner)).map(File::toPath);
    }

    @Override
    public Optional<Path> toWrite(Kind kind, String name, Optional<Path> beside) {
        FileChooser chooser = chooser(kind);
        chooser.setInitialFileName(name);
        beside.map(Path::getParent).map(Path::toFile).filter(File::isDirectory).ifPresent(chooser::setInitialDirectory);
        return Optional.ofNullable(chooser.showSaveDialog(owner))
                .map(File::toPath)
                .map(file -> ended(file, kind));
    }

    private static FileChooser chooser(Kind kind) {
        FileChooser chooser = new FileChooser();
        chooser.getExtensionFilters()
                .setAll(
                        new FileChooser.ExtensionFilter(kind.words(), "*." + kind.ending()),
                        new FileChooser.ExtensionFilter("All files", "*.*"));
        return chooser;
    }

    private static Path ended(Path file, Kind kind) {
        String name = String.valueOf(file.getFileName());
        return name.toLowerCase(Locale.ROOT).contains(".") ? file : file.resolveSibling(name + "." + kind.ending());
    }
}
