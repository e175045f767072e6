package clipramp.files;

import com.fasterxml.jackson.core.JsonLocation;
import com.fasterxml.jackson.core.JsonProcessingException;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/** Turns what the YAML parser says into our words. */
final class YamlWords {
    private static final Pattern POSITION = Pattern.compile("line (\\d+), column (\\d+)");

    private static final Map<String, String> SENTENCES = sentences();

    private YamlWords() {}

    private static Map<String, String> sentences() {
        Map<String, String> words = new LinkedHashMap<>();
        words.put(
                "mapping values are not allowed",
                "a second \": \" on one line, or a line indented that should not be. Put text with colons in quotes.");
        words.put("quoted scalar", "a quote is opened and never closed, or closed too early.");
        words.put(
                "cannot start any token",
                "a value cannot begin with this sign. Put it in quotes, or take the sign out.");
        words.put("flow mapping", "a brace { is not closed by }, or a comma is missing between two keys.");
        words.put("flow sequence", "a bracket [ is not closed by ], or a comma is missing between two items.");
        words.put("flow node", "a brace { or a bracket [ is opened and nothing stands behind it.");
        words.put("could not find expected ':'", "a key without its colon. Write \"key: value\".");
        words.put("expected <block end>", "this line is not indented like the others of its block.");
        words.put("sequence entries are not allowed", "a list item \"- \" has no place here.");
        words.put("mapping keys are not allowed", "a key has no place here.");
        words.put("block scalar", "the text block that begins with | or > is not indented as it should be.");
        words.put("Expected a field name", "a key is one word, not a list or a mapping.");
        words.put("directive", "directives (%) are not taken. Take the line out.");
        words.put("anchor", "anchors (&) are not taken. Write the value out where it is needed.");
        words.put("alias", "aliases (*) are not taken. Write the value out.");
        words.put("tag", "tags (!) are not taken. Leave the tag out; every value is its text.");
        words.put("expected '<document start>'", "text stands after the end of the design. Take it out.");
        return words;
    }

    /** Tabs and control characters, before the parser sees them; true where there were any. */
    static boolean refuseSigns(Source source, Findings findings) {
        int line = 1;
        int column = 1;
        boolean found = false;
        int lastRefusedLine = 0;
        for (int sign : source.text().codePoints().toArray()) {
            if (isRefused(sign) && line != lastRefusedLine) {
                String what = sign == '\t'
                        ? "a tab stands here. Indent and separate with spaces."
                        : String.format(Locale.ROOT, "a control sign (U+%04X) stands here. Take it out.", sign);
                findings.problem(Place.of(source.name(), line, column), "", what);
                found = true;
                lastRefusedLine = line;
            }
            column++;
            if (sign == '\n') {
                line++;
                column = 1;
            }
        }
        return found;
    }

    private static boolean isRefused(int sign) {
        return (sign < ' ' && sign != '\n' && sign != '\r')
                || (sign >= 0x7f && sign < 0xa0)
                || (sign >= 0xd800 && sign < 0xe000)
                || sign == 0xfeff
                || sign == 0xfffe
                || sign == 0xffff;
    }

    static void translate(JsonProcessingException e, Source source, Findings findings) {
        String said = Optional.ofNullable(e.getOriginalMessage()).orElse("");
        Place place = place(e, said, source.name());
        String sentence = SENTENCES.entrySet().stream()
                .filter(word -> said.contains(word.getKey()))
                .map(Map.Entry::getValue)
                .findFirst()
                .orElse("this line cannot be read as YAML.");
        findings.problem(place, "", sentence);
    }

    /**
     * The parser names where a brace or quote was opened, then where it gave up. The opening helps more where giving up came
     * lines later.
     */
    private static Place place(JsonProcessingException e, String said, String file) {
        List<Place> named = new ArrayList<>();
        Matcher position = POSITION.matcher(said);
        while (position.find()) {
            named.add(Place.of(file, Integer.parseInt(position.group(1)), Integer.parseInt(position.group(2))));
        }
        if (!named.isEmpty()) {
            Place opened = named.get(0);
            Place gaveUp = named.get(named.size() - 1);
            return opened.line() < gaveUp.line() && (said.contains("flow ") || said.contains("quoted"))
                    ? opened
                    : gaveUp;
        }
        JsonLocation location = e.getLocation();
        int behind = said.contains("Expected a field name") ? 1 : 0;
        return location == null
                ? Place.of(file, 1, 1)
                : Place.of(file, Math.max(1, location.getLineNr()), Math.max(1, location.getColumnNr() - behind));
    }
}
