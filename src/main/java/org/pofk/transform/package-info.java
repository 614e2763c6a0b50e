/**
 * The exact engine: from a chain to Y(z) in lowest terms, factored, with its proof. Knows nothing of how it is shown.
 */
package org.pofk.transform;
