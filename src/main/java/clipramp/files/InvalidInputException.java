package clipramp.files;

import java.util.List;

/** An input that cannot be used, with everything that is wrong with it. */
public final class InvalidInputException extends RuntimeException {
    private static final long serialVersionUID = 1L;

    private final transient List<Problem> problems;

    /** An input with these problems, at least one. */
    public InvalidInputException(List<Problem> problems) {
        super(Problem.texts(problems));
        this.problems = List.copyOf(problems);
    }

    /** At least one, in the order of their lines. */
    public List<Problem> problems() {
        return problems;
    }
}
