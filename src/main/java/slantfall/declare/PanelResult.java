package slantfall.declare;

import java.util.List;

/**
 * The checks of a panel with the phrase that sums them up.
 *
 * @param panel the question
 * @param results one per author
 * @param phrase the sum in words; rules that are unknown or out of range are left out of it
 */
public record PanelResult(Panel panel, List<CheckResult> results, String phrase) {

    public PanelResult {
        results = List.copyOf(results);
    }

    /**
     * Sums a panel up.
     *
     * @param house the house rule's result with its margin kept, null if none was chosen
     */
    public static PanelResult of(Panel panel, List<CheckResult> results, CheckResult house) {
        List<CheckResult> counting = results.stream().filter(CheckResult::counts).toList();
        long clear = counting.stream().filter(r -> r.verdict() != Verdict.CROSSED).count();
        long crossed = counting.size() - clear;
        return new PanelResult(panel, results, phrase(panel, clear, crossed, house));
    }

    private static String phrase(Panel panel, long clear, long crossed, CheckResult house) {
        long all = clear + crossed;
        if (all == 0) {
            return "no rule applies here";
        }
        boolean regime = panel.kindOfPanel() == Panel.Sort.REGIME;
        if (house != null && house.counts()) {
            return withHouse(panel, regime, clear, crossed, house);
        }
        if (all == 1) {
            return clear == 1 ? panel.clear() : panel.crossed();
        }
        if (crossed == 0) {
            return regime ? panel.clear() + " by all " + all : "clear of all " + all;
        }
        if (clear == 0) {
            return regime ? panel.crossed() + " by all " + all : "below all " + all;
        }
        return regime
                ? panel.clear() + " by " + clear + " of " + all + ", " + panel.crossed() + " by " + crossed
                : clear + " of " + all + " clear";
    }

    private static String withHouse(Panel panel, boolean regime, long clear, long crossed, CheckResult house) {
        boolean met = house.verdict() != Verdict.CROSSED;
        if (regime) {
            String mine = met ? panel.clear() : panel.crossed();
            long others = met ? crossed : clear;
            return others == 0 ? mine + " by all" : mine + " by your rule, others dispute";
        }
        if (met) {
            return crossed == 0 ? "clear of all" : "meets your rule, others dispute";
        }
        return clear == 0 ? "below all" : "below your rule, others allow";
    }
}
