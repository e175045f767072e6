package clipramp.circuit;

/** Title block of the record; every field may be empty, the date is ISO 8601 or empty. */
public record Document(String number, String revision, String preparedBy, String reviewedBy, String date) {
    public static final Document EMPTY = new Document("", "", "", "", "");
}
