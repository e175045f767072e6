package clipramp.files;

import clipramp.circuit.Design;
import java.util.List;

/**
 * A design as read, with everything that an answer must say about how it came to be.
 *
 * @param design the design
 * @param name the file's name as given, "-" for standard input
 * @param assumed every default that was used
 * @param profiles every profile that was used
 * @param notes what the reader must tell: data that were the middle of a band, comments that cannot be kept
 * @param overrides path=value, as given and in their order
 * @param inputDigest SHA-256, hexadecimal, over design, profiles and overrides
 */
public record LoadedDesign(
        Design design,
        String name,
        List<Assumed> assumed,
        List<ProfileUse> profiles,
        List<String> notes,
        List<String> overrides,
        String inputDigest) {
    /**
     * A default that was used.
     *
     * @param path the key, such as gate.overdrive
     * @param value the default in words, such as 3
     */
    public record Assumed(String path, String value) {}

    /**
     * A profile that was used.
     *
     * @param id the profile's id
     * @param kind its kind
     * @param from where it was found: program, beside the design, user folder
     * @param digest SHA-256 of its text, hexadecimal
     * @param hides profiles of the same id and other content that it hides, in words; empty where there are none
     */
    public record ProfileUse(String id, String kind, String from, String digest, String hides) {}

    /** Keeps the lists as they are. */
    public LoadedDesign {
        assumed = List.copyOf(assumed);
        profiles = List.copyOf(profiles);
        notes = List.copyOf(notes);
        overrides = List.copyOf(overrides);
    }
}
