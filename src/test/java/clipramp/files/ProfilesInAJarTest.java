package clipramp.files;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.io.OutputStream;
import java.net.URL;
import java.net.URLClassLoader;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;
import java.util.zip.ZipEntry;
import java.util.zip.ZipOutputStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** The program's profiles are listed from a jar as from a folder of classes. */
class ProfilesInAJarTest {
    @Test
    void areTheSameAsInAFolder(@TempDir Path folder) throws Exception {
        Path classes = Path.of(ProfileLibrary.class
                .getProtectionDomain()
                .getCodeSource()
                .getLocation()
                .toURI());
        Path jar = folder.resolve("program.jar");
        try (OutputStream out = Files.newOutputStream(jar);
                ZipOutputStream zip = new ZipOutputStream(out)) {
            for (String room : List.of("files", "profiles", "units", "circuit")) {
                add(classes, classes.resolve("clipramp").resolve(room), zip);
            }
        }
        ClassLoader others = new ClassLoader(getClass().getClassLoader()) {
            @Override
            protected Class<?> loadClass(String name, boolean resolve) throws ClassNotFoundException {
                if (name.startsWith("clipramp.")) {
                    throw new ClassNotFoundException(name);
                }
                return super.loadClass(name, resolve);
            }

            @Override
            public URL getResource(String name) {
                return name.startsWith("clipramp/") ? null : super.getResource(name);
            }
        };
        try (URLClassLoader loader = new URLClassLoader(new URL[] {jar.toUri().toURL()}, others)) {
            Class<?> library = loader.loadClass(ProfileLibrary.class.getName());
            assertThat(library).isNotSameAs(ProfileLibrary.class);
            Object shipped = library.getMethod("shipped").invoke(null);
            for (String kind : DevicePlace.allKinds()) {
                assertThat(library.getMethod("ids", String.class).invoke(shipped, kind))
                        .isEqualTo(ProfileLibrary.shipped().ids(kind));
            }
            assertThat(library.getMethod("find", String.class, String.class)
                            .invoke(shipped, "zener", "zener-20v")
                            .toString())
                    .contains("voltage: {min: 19 V");
        }
    }

    private static void add(Path root, Path folder, ZipOutputStream zip) throws IOException {
        try (Stream<Path> files = Files.walk(folder)) {
            for (Path file : files.filter(Files::isRegularFile).toList()) {
                zip.putNextEntry(new ZipEntry(root.relativize(file).toString().replace('\\', '/')));
                zip.write(Files.readAllBytes(file));
                zip.closeEntry();
            }
        }
    }
}
