package clipramp.sizing;

/**
 * Why a part is what it is, in one line.
 *
 * @param part the part
 * @param relation the relation that it starts from, with the numbers in
 * @param up what the next value up would do, a clause; empty where there is none
 * @param down what the next value down would do, a clause; empty where there is none
 */
public record Reason(OpenPart part, String relation, String up, String down) {}
