/** Documents of blocks, and one writer per format. Knows nothing of how a result was found. */
package org.pofk.report;
