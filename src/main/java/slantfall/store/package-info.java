/**
 * Files in and out: set-ups, presets of liquids, examples, assessments for programs and spreadsheets, the journal that
 * survives a crash, preferences. The only user of Jackson; set-ups need of it only the tokens, which know line and column and
 * cost no start-up time. What a file holds and is not understood is kept; what is refused says where and what to change.
 */
package slantfall.store;
