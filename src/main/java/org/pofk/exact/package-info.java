/** Exact numbers and polynomials, and certified enclosures of what has no short exact form. Knows nothing of chains. */
package org.pofk.exact;
