/** The formula tree, its parser and its printers. Knows nothing of what a formula means. */
package org.pofk.formula;
