package clipramp;

import java.util.stream.Stream;

/** The way in for whoever starts the program from a menu of programs or by opening a design file: straight to the window. */
public final class Window {
    private Window() {}

    public static void main(String[] arguments) {
        Main.main(Stream.concat(Stream.of("desk"), Stream.of(arguments)).toArray(String[]::new));
    }
}
