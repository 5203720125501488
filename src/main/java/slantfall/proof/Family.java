package slantfall.proof;

/**
 * The published values that one production formula answers for.
 *
 * @param prefix first part of the ids, such as {@code 1.N.Re}; the longest that fits wins
 * @param formula what is recomputed, in words
 * @param recompute the adapter to the production formula
 */
record Family(String prefix, String formula, Recompute recompute) {

    boolean covers(String id) {
        return id.equals(prefix) || id.startsWith(prefix + ".");
    }

    /** Numbers recomputed for a row, in the order of its expected numbers. */
    @FunctionalInterface
    interface Recompute {

        /**
         * The recomputed numbers.
         *
         * @param row the row
         * @throws IllegalArgumentException with the reason, if the row's inputs do not allow it
         */
        double[] of(PublishedRow row);
    }

    /** One number from the inputs. */
    @FunctionalInterface
    interface OneNumber {
        double of(Inputs in);
    }

    /** A fixed list of numbers from the inputs. */
    @FunctionalInterface
    interface Numbers {
        double[] of(Inputs in);
    }

    /** A family whose rows expect one number, or several readings of the same one. */
    static Family one(String prefix, String formula, OneNumber number) {
        return new Family(prefix, formula, row -> {
            double[] same = new double[row.expected().size()];
            java.util.Arrays.fill(same, number.of(row.inputs()));
            return same;
        });
    }

    /** A family whose rows expect a list. */
    static Family list(String prefix, String formula, Numbers numbers) {
        return new Family(prefix, formula, row -> numbers.of(row.inputs()));
    }
}
