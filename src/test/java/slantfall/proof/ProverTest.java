package slantfall.proof;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import slantfall.proof.PublishedRow.Expected;
import slantfall.proof.PublishedRow.Origin;
import slantfall.proof.PublishedRow.Tolerance;
import slantfall.store.ProofRows;

/** Carried values are reproduced; wrong ones are not. */
class ProverTest {

    @Test
    void everyCarriedValueIsReproduced() {
        ProofResult result = Prover.prove(ProofRows.shipped());
        assertThat(result.unknown()).isEmpty();
        assertThat(result.rows()).hasSizeGreaterThan(100);
        assertThat(result.rows()).allSatisfy(row -> assertThat(row.ok()).as(row.toString()).isTrue());
        assertThat(result.ok()).isTrue();
    }

    @Test
    void everyFamilyHasACarriedValueAndIdsAreUnique() {
        List<PublishedRow> rows = ProofRows.shipped();
        assertThat(rows).extracting(PublishedRow::id).doesNotHaveDuplicates();
        assertThat(Families.ALL).extracting(Family::prefix).doesNotHaveDuplicates();
        assertThat(Families.ALL).allSatisfy(family ->
                assertThat(rows).anyMatch(row -> Families.of(row.id()).filter(f -> f == family).isPresent()));
    }

    @Test
    void aToleranceIsNeverWiderThanAPrintedTableNeeds() {
        assertThat(ProofRows.shipped()).allSatisfy(row -> {
            boolean correlationAgainstMeasurement = row.id().startsWith("10.gly.SO") || row.id().startsWith("10.suc.BJ");
            double widest = correlationAgainstMeasurement ? 0.04 : 1e-4;
            assertThat(row.tolerance().relative()).as(row.id()).isLessThanOrEqualTo(widest);
        });
    }

    @Test
    void aTamperedValueFails() {
        for (PublishedRow row : ProofRows.shipped()) {
            for (ProofResult.Row result : Prover.prove(List.of(tampered(row))).rows()) {
                assertThat(result.ok()).as(result.toString()).isFalse();
                assertThat(result.deviation()).isGreaterThan(result.tolerance());
            }
        }
    }

    @Test
    void listsAndTablesGiveOneRowPerNumber() {
        assertThat(Prover.prove(ProofRows.shipped()).rows())
                .extracting(ProofResult.Row::id)
                .contains("1.N.h", "1.N.Re[0]", "1.N.Re[2]", "2.reg.water20[Brauer_turb_G]");
    }

    @Test
    void deviationIsAbsoluteWhereABoundIsGivenOrNothingIsExpected() {
        ProofResult.Row vertical = only(row("2.Rec.90", Map.of("beta_deg", 90.0), new Tolerance(0, 1e-12), 0, 0, 0));
        assertThat(vertical.absolute()).isTrue();
        assertThat(vertical.tolerance()).isEqualTo(1e-12);
        ProofResult.Row zero = only(row("1.N.h", film(0), new Tolerance(1e-9, Double.NaN), 0));
        assertThat(zero.absolute()).isTrue();
        assertThat(zero.ok()).isTrue();
        ProofResult.Row relative = only(row("5.taper.beq", Map.of("b1", 2e-3, "b2", 2e-3), tolerance(), 4e-3));
        assertThat(relative.absolute()).isFalse();
        assertThat(relative.deviation()).isCloseTo(0.5, org.assertj.core.data.Offset.offset(1e-12));
        assertThat(relative.ok()).isFalse();
    }

    @Test
    void anUnknownFamilyIsListedAndNotJudged() {
        ProofResult result = Prover.prove(List.of(
                row("9.levels.a", Map.of(), tolerance(), 1), row("1.Nothing", Map.of(), tolerance(), 1),
                row("5.taper.beq", Map.of("b1", 1e-3, "b2", 1e-3), tolerance(), 1e-3)));
        assertThat(result.unknown()).containsExactly("9.levels.a", "1.Nothing");
        assertThat(result.rows()).hasSize(1);
        assertThat(result.ok()).isTrue();
    }

    @Test
    void theLongestPrefixDecides() {
        assertThat(Families.of("5.Jones.phi").map(Family::prefix)).hasValue("5.Jones.phi");
        assertThat(Families.of("5.Jones.5000").map(Family::prefix)).hasValue("5.Jones");
        assertThat(Families.of("2.reg.water20").map(Family::prefix)).hasValue("2.reg");
        assertThat(Families.of("5.rectangle")).isEmpty();
    }

    @Test
    void aRowThatCannotBeComputedSaysWhy() {
        assertThat(only(row("1.N.h", Map.of("rho", 1000.0), tolerance(), 1)).reason()).contains("mu is missing");
        assertThat(only(row("5.taper.beq", Map.of("b1", -1.0, "b2", 1.0), tolerance(), 1)).reason())
                .contains("b1 is -1.0").contains("above 0");
        assertThat(only(row("2.Rec.0", Map.of("beta_deg", 0.0), tolerance(), 1, 1, 1)).reason()).contains("above 0");
        assertThat(only(row("1.N.Re", film(0.05), tolerance(), 1)).reason()).contains("gives 3 numbers").contains("expects 1");
        assertThat(only(row("2.reg.x", Map.of("rho", 1e3, "mu", 1e-3, "sigma", 0.07, "g", 9.8), tolerance(), 1)).reason())
                .contains("no check holds the limit");
        assertThat(only(row("1.N.tube_in", tube(), tolerance(), 1)).reason()).contains("between 0 and the radius");
    }

    @Test
    void aNumberThatDoesNotExistIsNotOk() {
        ProofResult.Row row = only(row("1.N.um", film(0), tolerance(), 1));
        assertThat(row.obtained()).isNaN();
        assertThat(row.ok()).isFalse();
        assertThat(row.reason()).contains("NaN");
        ProofResult.Row huge = only(row("1.N.tw", Map.of("rho", 1e308, "mu", 1e308, "beta_deg", 30.0, "g", 9.8,
                "Gamma", 1e308), new Tolerance(1e300, Double.NaN), 1));
        assertThat(huge.ok()).isFalse();
    }

    @Test
    void marksInWords() {
        assertThat(MarkWords.of("M/C")).isEqualTo("from memory; derived and computed here");
        assertThat(MarkWords.of("S2+C")).isEqualTo("read second-hand; derived and computed here");
        assertThat(MarkWords.of("S coeff / M form / C"))
                .isEqualTo("read in the source (coeff); from memory (form); derived and computed here");
        assertThat(MarkWords.of("")).isEqualTo("no mark");
        assertThat(MarkWords.of("Z")).isEqualTo("unknown mark Z");
        assertThat(ProofRows.shipped()).allSatisfy(row ->
                assertThat(row.origin().markInWords()).doesNotContain("unknown").isNotEqualTo("no mark"));
    }

    private static PublishedRow tampered(PublishedRow row) {
        List<Expected> wrong = row.expected().stream()
                .map(e -> new Expected(e.place(), e.value() == 0 ? 1 : e.value() * 1.1))
                .toList();
        return new PublishedRow(
                row.id(), row.quantity(), row.inputs(), wrong, row.tolerance(), row.origin(), row.problem());
    }

    private static ProofResult.Row only(PublishedRow row) {
        return Prover.prove(List.of(row)).rows().get(0);
    }

    private static PublishedRow row(String id, Map<String, Double> inputs, Tolerance tolerance, double... expected) {
        List<Expected> numbers = new java.util.ArrayList<>();
        for (int i = 0; i < expected.length; i++) {
            numbers.add(new Expected(expected.length == 1 ? "" : Integer.toString(i), expected[i]));
        }
        return new PublishedRow(
                id, "", Inputs.of(inputs), numbers, tolerance, new Origin("", "C", "", false), "");
    }

    private static Tolerance tolerance() {
        return new Tolerance(1e-9, Double.NaN);
    }

    private static Map<String, Double> film(double feed) {
        return Map.of("rho", 1000.0, "mu", 1e-3, "beta_deg", 30.0, "g", 9.80665, "Gamma", feed);
    }

    private static Map<String, Double> tube() {
        return Map.of("rho", 1000.0, "mu", 1e-3, "g", 9.80665, "R", 0.01, "h", 0.02);
    }
}
