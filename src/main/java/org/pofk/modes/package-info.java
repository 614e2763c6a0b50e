/** From Y(z) to the closed form as a sum of modes. Knows nothing of reports. */
package org.pofk.modes;
