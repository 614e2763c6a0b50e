package org.pofk.exact;

import java.util.List;

/** The real roots of a rational polynomial and those of the open upper half-plane, in no particular order. */
record RealAndAbove(List<EnclosedComplex> real, List<EnclosedComplex> above) {
    RealAndAbove {
        real = List.copyOf(real);
        above = List.copyOf(above);
    }
}
