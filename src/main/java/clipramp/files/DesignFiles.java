package clipramp.files;

import clipramp.circuit.Design;
import clipramp.files.Node.Mapping;
import clipramp.files.ProfileLibrary.Found;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** Reads design files. */
public final class DesignFiles {
    private DesignFiles() {}

    /**
     * Reads a design.
     *
     * @param source the file's name and text
     * @param overrides path=value, as given with {@code --with}, applied in their order
     * @param library where profiles are found
     * @throws InvalidInputException with everything that is wrong, in the order of its lines
     */
    public static LoadedDesign load(Source source, List<String> overrides, ProfileLibrary library) {
        Findings findings = new Findings();
        Optional<Mapping> tree = YamlTree.read(source, findings);
        if (tree.isEmpty()) {
            throw new InvalidInputException(findings.problems());
        }
        Version.check(tree.get(), findings);
        if (isNewer(tree.get())) {
            throw new InvalidInputException(findings.problems());
        }
        Devices devices = new Devices(library, findings);
        Mapping changed = new Overrides(devices, findings).apply(tree.get(), overrides);
        Optional<Design> design = new DesignReader(changed, findings, devices).read();
        findings.throwIfAny();
        devices.uses().stream()
                .filter(u -> !u.hides().isEmpty())
                .forEach(u -> findings.note("The profile " + u.id() + " comes from: " + u.from()
                        + ". It hides a different one: " + u.hides() + "."));
        return new LoadedDesign(
                design.orElseThrow(),
                source.name(),
                findings.assumed(),
                devices.uses(),
                findings.notes(),
                overrides,
                inputDigest(source, devices.used(), overrides, findings.alsoRead()));
    }

    /** A newer format may have keys that would be reported as unknown, which helps nobody. */
    private static boolean isNewer(Mapping tree) {
        String version = tree.textOf("clipramp");
        return version.matches("[1-9]\\d{0,8}") && Integer.parseInt(version) > Version.CURRENT;
    }

    private static String inputDigest(Source source, List<Found> used, List<String> overrides, List<String> alsoRead) {
        List<String> texts = new ArrayList<>();
        texts.add(source.text());
        used.forEach(f -> texts.add(f.kind() + "/" + f.id() + "\n" + f.source().text()));
        texts.add(String.valueOf(overrides.size()));
        texts.addAll(overrides);
        texts.addAll(alsoRead);
        return Digest.of(texts);
    }
}
