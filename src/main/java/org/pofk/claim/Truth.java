package org.pofk.claim;

import org.pofk.chain.Chain;

/** What is true of one chain, exact, each part worked out when first asked for and kept. */
public final class Truth {
    private final Chain chain;

    private Truth(Chain chain) {
        this.chain = chain;
    }

    public static Truth of(Chain chain) {
        return new Truth(chain);
    }

    public Chain chain() {
        return chain;
    }
}
