package clipramp.files;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.regex.MatchResult;
import java.util.regex.Pattern;
import org.junit.jupiter.api.Test;

class LicencesTest {
    private static final Pattern DEPENDENCY = Pattern.compile("(?s)<dependency>(.*?)</dependency>");
    private static final Pattern ARTIFACT = Pattern.compile("<artifactId>([^<]+)</artifactId>");

    @Test
    void everyRuntimeDependencyIsNamedWithALicence() throws IOException {
        String whole = Files.readString(Path.of("pom.xml"), StandardCharsets.UTF_8);
        String pom = whole.substring(whole.indexOf("</dependencyManagement>"), whole.indexOf("<build>"));
        List<String> runtime = DEPENDENCY
                .matcher(pom)
                .results()
                .map(MatchResult::group)
                .filter(dependency -> !dependency.contains("<scope>"))
                .flatMap(dependency -> ARTIFACT.matcher(dependency).results().limit(1))
                .map(artifact -> artifact.group(1))
                .toList();

        assertThat(runtime).hasSizeGreaterThan(10);
        assertThat(runtime)
                .allSatisfy(artifact -> assertThat(Licences.overview().lines())
                        .anyMatch(line -> line.matches("- (.*, )?" + Pattern.quote(artifact) + "[,:].*")));
    }

    @Test
    void everyPointNamesALicenceWhoseTextIsHere() {
        assertThat(Licences.overview().lines().filter(line -> line.startsWith("- ")))
                .isNotEmpty()
                .allMatch(line -> Licences.ids().stream().anyMatch(line::contains));
        assertThat(Licences.ids())
                .allSatisfy(id -> assertThat(Licences.text(id)).as(id).hasSizeGreaterThan(1000));
    }

    @Test
    void theProgramsOwnLicenceIsTheOneBesideThePom() throws IOException {
        assertThat(Licences.text("Apache-2.0"))
                .isEqualTo(Files.readString(Path.of("LICENSE"), StandardCharsets.UTF_8))
                .contains("TERMS AND CONDITIONS FOR USE, REPRODUCTION, AND DISTRIBUTION");
    }
}
