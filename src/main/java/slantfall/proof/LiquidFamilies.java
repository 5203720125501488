package slantfall.proof;

import java.util.List;

/** Section 10: correlations of the liquids. */
final class LiquidFamilies {

    static final List<Family> ALL = List.of();

    private LiquidFamilies() {}
}
