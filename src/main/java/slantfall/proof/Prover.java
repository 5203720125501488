package slantfall.proof;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import slantfall.proof.PublishedRow.Expected;

/** Recomputes published values with the production formulas and says how far off they are. */
public final class Prover {

    private Prover() {}

    /** Recomputes every row; a row that cannot be recomputed is not ok and says why. */
    public static ProofResult prove(List<PublishedRow> rows) {
        List<ProofResult.Row> results = new ArrayList<>();
        List<String> unknown = new ArrayList<>();
        for (PublishedRow row : rows) {
            Optional<Family> family = Families.of(row.id());
            if (family.isEmpty() && !row.id().isEmpty()) {
                unknown.add(row.id());
            } else if (!row.problem().isEmpty()) {
                results.add(broken(row, row.problem()));
            } else {
                results.addAll(recompute(row, family.orElseThrow()));
            }
        }
        return new ProofResult(results, unknown);
    }

    private static List<ProofResult.Row> recompute(PublishedRow row, Family family) {
        double[] obtained;
        try {
            obtained = family.recompute().of(row);
        } catch (RuntimeException e) {
            return each(row, new double[0], e.getMessage() == null ? e.toString() : e.getMessage());
        }
        int wanted = row.expected().size();
        if (obtained.length != wanted) {
            return each(row, new double[0], "the family " + family.prefix() + " gives " + obtained.length
                    + " numbers, the row expects " + wanted);
        }
        return each(row, obtained, "");
    }

    private static List<ProofResult.Row> each(PublishedRow row, double[] obtained, String reason) {
        List<ProofResult.Row> results = new ArrayList<>();
        for (int i = 0; i < row.expected().size(); i++) {
            Expected number = row.expected().get(i);
            results.add(judge(row, number, i < obtained.length ? obtained[i] : Double.NaN, reason));
        }
        return results;
    }

    private static ProofResult.Row judge(PublishedRow row, Expected number, double obtained, String reason) {
        double expected = number.value();
        boolean absolute = row.tolerance().absoluteFor(expected);
        double bound = row.tolerance().bound();
        double difference = Math.abs(obtained - expected);
        double deviation = absolute ? difference : difference / Math.abs(expected);
        String why = !reason.isEmpty() || Double.isFinite(obtained) ? reason : "the formula gives " + obtained;
        return new ProofResult.Row(
                row.id(number),
                row.quantity(),
                row.origin().source(),
                row.origin().mark(),
                expected,
                obtained,
                deviation,
                bound,
                absolute,
                why.isEmpty() && deviation <= bound,
                why);
    }

    private static ProofResult.Row broken(PublishedRow row, String reason) {
        return new ProofResult.Row(row.id(), row.quantity(), row.origin().source(), row.origin().mark(),
                Double.NaN, Double.NaN, Double.NaN, Double.NaN, false, false, reason);
    }
}
