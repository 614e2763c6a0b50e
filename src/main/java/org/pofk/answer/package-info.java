/** What follows from the formulas: long run, comparison with simulation, second opinion. Knows nothing of files. */
package org.pofk.answer;
