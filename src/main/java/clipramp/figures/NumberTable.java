package clipramp.figures;

import java.util.List;

/**
 * A figure's numbers, for whoever reads rather than looks.
 *
 * @param heads what each column holds, with its unit
 * @param rows cells as text, as many as there are heads in every row
 */
public record NumberTable(List<String> heads, List<List<String>> rows) {
    /**
     * Refuses a ragged table.
     *
     * @throws IllegalArgumentException where a row has not as many cells as there are heads
     */
    public NumberTable {
        heads = List.copyOf(heads);
        rows = rows.stream().map(List::copyOf).toList();
        for (List<String> row : rows) {
            if (row.size() != heads.size()) {
                throw new IllegalArgumentException("a row of " + row.size() + " under " + heads.size() + " heads");
            }
        }
    }
}
