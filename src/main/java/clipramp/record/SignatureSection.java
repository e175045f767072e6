package clipramp.record;

import clipramp.circuit.Document;

/** Who prepared, reviewed and released this record. */
final class SignatureSection {
    private SignatureSection() {}

    static void write(Paper paper, RecordContent content) {
        paper.need(170);
        paper.section("Signatures");
        paper.text("A signature says that the record was read, not that the circuit may be built or connected.");
        Document block = content.check().design().document();
        Grid grid = new Grid(paper.faces(), new float[] {1.4f, 2.6f, 3.4f, 1.6f});
        grid.heads("", "name", "signature", "date");
        for (String[] line : new String[][] {
            {"prepared by", block.preparedBy()}, {"reviewed by", block.reviewedBy()}, {"released by", ""}
        }) {
            grid.row("\n" + line[0] + "\n ", "\n" + line[1], "", "");
        }
        paper.add(grid.table());
    }
}
