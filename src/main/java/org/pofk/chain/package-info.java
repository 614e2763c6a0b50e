/** A chain and what can be read off its graph: classes, periods, what is reached. Knows nothing of files or of z. */
package org.pofk.chain;
