/**
 * View models shared by the parts of the window: properties and no nodes, so that a test drives them without a window.
 */
package slantfall.bench.model;
