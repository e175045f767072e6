package clipramp.units;

/**
 * Why a text is not taken as a quantity.
 *
 * @param read the text as it stood
 * @param meaning what it would mean if it were taken, such as "0.010 Ω"; empty where it means nothing
 * @param expected what would be taken, such as "100 Ω..1 MΩ"
 * @param suggestion what to write instead, a sentence or a question; may be empty
 */
public record Refusal(String read, String meaning, String expected, String suggestion) {
    /** The whole: {@code read "10 mohm" (0.010 Ω); expected 100 Ω..1 MΩ. 10 Mohm or 10 kohm?}. */
    public String message() {
        StringBuilder message = new StringBuilder("read \"").append(read).append('"');
        if (!meaning.isEmpty()) {
            message.append(" (").append(meaning).append(')');
        }
        message.append("; expected ").append(expected);
        if (suggestion.isEmpty()) {
            return message.append('.').toString();
        }
        return message.append(". ").append(suggestion).toString();
    }
}
