package clipramp.cli;

/** What a command tells the shell. */
final class ExitCode {
    /** Answered. */
    static final int ANSWERED = 0;
    /** Answered, and a margin fails. */
    static final int FAILS = 1;
    /** The input or the options cannot be used. */
    static final int UNUSABLE = 2;
    /** The program itself is at fault. */
    static final int OUR_FAULT = 3;
    /** A file cannot be read or written. */
    static final int FILE = 4;
    /** Interrupted. */
    static final int INTERRUPTED = 130;

    /** All of them, for people. */
    static final String IN_WORDS = "0 answered; 1 a margin fails; 2 input or options cannot be used; 3 our own fault;"
            + " 4 a file cannot be read or written; 130 interrupted.";

    private ExitCode() {}
}
