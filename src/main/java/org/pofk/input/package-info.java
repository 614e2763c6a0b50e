/** Model and matrix files, with the place of every fault. Knows nothing of the command line. */
package org.pofk.input;
