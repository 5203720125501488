package slantfall.bench.shell;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;
import slantfall.bench.MemoryDisk;
import slantfall.bench.model.Desk;
import slantfall.bench.model.Pulse;
import slantfall.session.Session;

/** Finds by words, keys and symbols. */
class FinderModelTest {

    private final FinderModel finder = new FinderModel(new Desk(new Session(MemoryDisk.film()), Pulse.atOnce()));

    @Test
    void findsASettingByItsName() {
        assertThat(finder.find("incl").get(0).key()).isEqualTo("angle");
    }

    @Test
    void findsAReadingByItsSymbol() {
        assertThat(finder.find("τ_w")).extracting(FinderModel.Hit::key).contains("wallShear");
    }

    @Test
    void findsACheckByItsAuthor() {
        assertThat(finder.find("brauer")).isNotEmpty().allMatch(h -> h.sort() == FinderModel.Sort.CHECK);
    }

    @Test
    void findsALiquidPropertyThatIsNotSet() {
        assertThat(finder.find("contact")).extracting(FinderModel.Hit::key).contains("liquid.contactAngle");
    }

    @Test
    void allWordsMustMatch() {
        assertThat(finder.find("velocity reading")).isNotEmpty().allMatch(h -> h.sort() == FinderModel.Sort.READING);
        assertThat(finder.find("velocity nonsense")).isEmpty();
    }
}
