package clipramp.circuit;

/**
 * Title block of the record; every field may be empty.
 *
 * @param number document number, as the maker counts
 * @param revision which issue of it
 * @param preparedBy who drew it up
 * @param reviewedBy who looked it over
 * @param date ISO 8601
 */
public record Document(String number, String revision, String preparedBy, String reviewedBy, String date) {
    /** A title block with nothing in it. */
    public static final Document EMPTY = new Document("", "", "", "", "");
}
