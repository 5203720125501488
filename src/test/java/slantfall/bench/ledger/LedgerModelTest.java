package slantfall.bench.ledger;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.withinPercentage;

import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import slantfall.bench.MemoryDisk;
import slantfall.bench.model.Desk;
import slantfall.bench.model.Pulse;
import slantfall.declare.Value;
import slantfall.declare.Verdict;
import slantfall.declare.Working;
import slantfall.quantity.UnitSystem;
import slantfall.session.Session;

/** What the ledger says, without a window. */
class LedgerModelTest {

    private Desk desk;
    private LedgerModel ledger;

    @BeforeEach
    void open() {
        desk = new Desk(new Session(MemoryDisk.film()), Pulse.atOnce());
        ledger = new LedgerModel(desk);
    }

    private ReadingRow row(String key) {
        return ledger.readings().stream().filter(r -> r.reading().key().equals(key)).findFirst().orElseThrow();
    }

    @Test
    void readingsHaveThreeDigitsInTheChosenUnits() {
        assertThat(row("thickness").numberProperty().get().replaceAll("^[0.]+", "").replace(".", "")).hasSize(3);
        assertThat(row("thickness").unitProperty().get()).isIn("µm", "mm");
        desk.unitsProperty().set(UnitSystem.US);
        assertThat(row("thickness").unitProperty().get()).isEqualTo("mil");
        double mil = Double.parseDouble(row("thickness").numberProperty().get());
        assertThat(mil * 25.4e-6).isCloseTo(desk.assessment().value("thickness"), withinPercentage(0.5));
    }

    @Test
    void readingsFollowASetting() {
        String before = row("thickness").numberProperty().get();
        desk.session().set("feed", Value.of(0.2), null);
        assertThat(row("thickness").numberProperty().get()).isNotEqualTo(before);
    }

    @Test
    void panelsStandTightestFirst() {
        for (int i = 1; i < ledger.panels().size(); i++) {
            assertThat(ledger.panels().get(i - 1).tightest()).isLessThanOrEqualTo(ledger.panels().get(i).tightest());
        }
    }

    @Test
    void eachPanelOpensIntoAllItsAuthors() {
        long authors = ledger.panels().stream().mapToLong(p -> p.authors().size()).sum();
        assertThat(authors).isEqualTo(desk.declaration().checks().size());
        ledger.panels().forEach(p -> assertThat(p.phraseProperty().get()).isNotBlank());
    }

    @Test
    void aRequirementGivesWordNumberAndMargin() {
        CheckRow own = ledger.own().get(0);
        assertThat(own.verdictProperty().get()).isEqualTo(Verdict.CLEAR);
        assertThat(own.comparedProperty().get()).contains("at most").contains("1.00 mm");
        desk.session().set("feed", Value.of(9), null);
        assertThat(own.verdictProperty().get()).isEqualTo(Verdict.CROSSED);
        assertThat(own.marginProperty().get()).contains("over");
    }

    @Test
    void aReadingThatIsUnknownSaysWhy() {
        desk.session().set("feed", Value.of(0), null);
        assertThat(row("residenceMean").numberProperty().get()).isEqualTo("unknown");
        assertThat(row("residenceMean").whyProperty().get()).contains("feed");
    }

    @Test
    void theWorkingEndsInTheReading() {
        Working working = ledger.working("thickness").orElseThrow();
        assertThat(working.last().result()).isEqualTo(desk.assessment().value("thickness"));
        String text = WorkingText.text(working, UnitSystem.SI);
        assertThat(text).contains(working.last().formula()).contains("with ").contains("holds for:");
        assertThat(text).contains(working.last().source().citation());
    }

    @Test
    void theTableHasEveryRowAndTheSentenceThatDefers() {
        String table = ledger.table();
        ledger.readings().forEach(r -> assertThat(table).contains(r.reading().name() + "\t"));
        desk.declaration().checks().forEach(c -> assertThat(table).contains(c.name() + "\t"));
        assertThat(table).contains(ledger.general()).startsWith("Rinse wall\n");
    }

    @Test
    void anotherArrangementHasItsOwnRows() {
        desk.open(MemoryDisk.slot(), null, null);
        assertThat(ledger.readings()).hasSize(desk.declaration().readings().size());
        assertThat(ledger.own()).isEmpty();
        assertThat(ledger.cautions()).contains("Spilt glycerol is slippery.");
    }
}
