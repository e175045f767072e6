package clipramp.margins;

/**
 * Something that a reader of an answer should know and that is no margin.
 *
 * @param id stable word for machines
 * @param text a sentence for people
 */
public record Note(String id, String text) {}
