/** Flow between two walls. */
package slantfall.flow.slot;
