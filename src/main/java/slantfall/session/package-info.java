/**
 * The current set-up with its history, and the scheduler that keeps heavy work off the screen thread. No JavaFX: the
 * window and a test drive it alike.
 */
package slantfall.session;
