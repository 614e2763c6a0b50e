/**
 * Where p(k) goes and how fast: limits, cycles, growth, closed classes, bounds on what decays. Knows nothing of
 * questions.
 */
package org.pofk.longrun;
