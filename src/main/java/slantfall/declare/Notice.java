package slantfall.declare;

/**
 * A condition worth knowing that is no error: a value outside its usual range, a law outside its tested range, a
 * reading that has no meaning here.
 *
 * @param about key of the setting, reading, check or property it concerns, empty for the whole
 * @param text one sentence
 */
public record Notice(String about, String text) {}
