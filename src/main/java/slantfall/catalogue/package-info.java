/** The explicit list of arrangements: no reflection, no scanning. */
package slantfall.catalogue;
