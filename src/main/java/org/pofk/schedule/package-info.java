/**
 * The same questions where inspections and phases recur: cycles, their formulas, what they tend to. Knows nothing of
 * files.
 */
package org.pofk.schedule;
