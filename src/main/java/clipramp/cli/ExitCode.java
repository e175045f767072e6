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

    private ExitCode() {}
}
