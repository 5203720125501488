package slantfall.store;

/** The version of the file format; its history stands in docs/file-format.md. */
final class Version {

    /** What this program writes, and the newest it reads. */
    static final int CURRENT = 1;

    /** The key it stands under. */
    static final String KEY = "slantfall";

    private Version() {}

    /** Refuses files of newer versions and what is no set-up at all. */
    static void check(Fields fields) {
        Node node = fields.need(KEY, "Add \"slantfall\": " + CURRENT + " if this is a set-up of Slantfall");
        if (!node.is(Node.Sort.NUMBER) || !node.text().matches("-?\\d{1,9}")) {
            throw node.problem("the version must be a whole number, was " + node.sort().words(), "Write " + CURRENT);
        }
        int version = Integer.parseInt(node.text());
        if (version > CURRENT) {
            throw node.problem("the file was written by a newer Slantfall (format " + version + ", this one reads up to "
                    + CURRENT + ")", "Open it with the newer one; nothing was changed");
        }
        if (version < 1) {
            throw node.problem("there is no format " + version, "Write " + CURRENT);
        }
    }
}
