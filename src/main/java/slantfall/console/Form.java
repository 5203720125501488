package slantfall.console;

/** How results are written. */
enum Form {
    TEXT,
    JSON,
    CSV
}
