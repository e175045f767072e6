package clipramp;

import java.io.File;
import java.net.URL;
import java.net.URLClassLoader;
import java.util.Arrays;
import java.util.stream.Collectors;

/** The class path of whoever runs the tests (Maven, a console, a class loader of its own), for a process of one's own. */
public final class OwnClassPath {
    private OwnClassPath() {}

    public static String text() {
        if (OwnClassPath.class.getClassLoader() instanceof URLClassLoader loader) {
            return Arrays.stream(loader.getURLs()).map(URL::getPath).collect(Collectors.joining(File.pathSeparator));
        }
        return System.getProperty("surefire.test.class.path", System.getProperty("java.class.path"));
    }
}
