package clipramp.files;

/**
 * Where something stands.
 *
 * @param file file name as given
 * @param line from 1; 0 for none
 * @param column from 1, in code points; 0 for none
 * @param start offset of its first code point in the source; -1 for none
 * @param end offset behind its last code point; -1 for none
 */
record Place(String file, int line, int column, int start, int end) {
    static Place of(String file, int line, int column) {
        return new Place(file, line, column, -1, -1);
    }

    /** An override has no line. */
    static Place override() {
        return of("--with", 0, 0);
    }
}
