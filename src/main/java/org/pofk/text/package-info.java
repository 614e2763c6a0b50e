/** Places in a source text, faults with positions, and suggestions of what was meant. Knows nothing of anything else. */
package org.pofk.text;
