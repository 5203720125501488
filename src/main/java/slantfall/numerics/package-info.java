/** Root finding, quadrature and fitting; the only user of Commons Math. */
package slantfall.numerics;
