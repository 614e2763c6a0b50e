/** Values step by step: exact, in fixed point, by modes; states as whole numbers. Knows nothing of questions. */
package org.pofk.steps;
