/** Rectangular ducts: what side walls do to a slot. */
package slantfall.flow.duct;
