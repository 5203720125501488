package slantfall.declare;

/**
 * The check of a panel that this user has chosen to design by.
 *
 * @param panel key of the panel
 * @param rule key of the check
 * @param margin relative margin, such as 0.25 for 25 %
 * @param typedMargin what the user typed
 */
public record HouseRule(String panel, String rule, double margin, String typedMargin) {

    public HouseRule {
        if (!(margin >= 0 && margin < 100)) {
            throw new IllegalArgumentException("house rule of " + panel + ": margin must be 0 or more, below 10000 %");
        }
    }

    /** Key of the check that it becomes. */
    public String checkKey() {
        return "house." + panel;
    }

    /** The limit that applies with the margin kept [unit of the check]; a linear check keeps a part of its span. */
    public double limit(CheckInfo info, double limit) {
        double sign = info.side() == Side.AT_MOST ? -1 : 1;
        return info.scale() == Scale.LOG ? limit * Math.pow(1 + margin, sign) : limit + sign * margin * info.span();
    }

    /** The check's margin less what this rule keeps in hand. */
    public double margin(CheckInfo info, double margin) {
        double kept = info.scale() == Scale.LOG ? Math.log1p(this.margin) : this.margin;
        return Math.abs(margin) >= Margin.CLAMP ? margin : Margin.clamp(margin - kept);
    }
}
