/** The commands, their exit codes and their help. Knows nothing of mathematics. */
package org.pofk.cli;
