/**
 * Places in a source text, faults with positions, suggestions of what was meant; what characters a screen takes and how
 * wide they are. Knows nothing of anything else.
 */
package org.pofk.text;
