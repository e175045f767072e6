package clipramp.files;

import java.util.Optional;

/**
 * A text such as "1.2 kW at 230 V", cut at its "at".
 *
 * @param what before it
 * @param at behind it, if there is one
 */
record AtPhrase(String what, Optional<String> at) {
    static AtPhrase of(String text) {
        int at = text.indexOf(" at ");
        return at < 0
                ? new AtPhrase(text.strip(), Optional.empty())
                : new AtPhrase(
                        text.substring(0, at).strip(),
                        Optional.of(text.substring(at + 4).strip()));
    }
}
