/** The drawer below the pictures: one question to ask of the set-up at a time, headed in plain words. */
package slantfall.bench.question;
