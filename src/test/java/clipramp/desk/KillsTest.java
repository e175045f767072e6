package clipramp.desk;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;

class KillsTest {
    /** Two here, to keep the tests fast; {@link Kills} does as many as wanted. */
    @Test
    void aWindowKilledInTheMiddleOfItsEditsLeavesTheWorkToBeTakenBack() throws Exception {
        long seed = 20310131;
        assertThat(Kills.kill(2, seed)).as("seed %d", seed).isEqualTo(2);
    }
}
