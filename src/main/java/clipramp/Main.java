package clipramp;

/** The one way in. */
public final class Main {
    private Main() {}

    public static void main(String[] arguments) {}
}
