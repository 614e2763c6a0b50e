package org.pofk.check;

/** Ways to write the same p(k). */
enum Notation {
    /** Σ c λ^k, pairs as amplitude and phase, repeated poles with binomial(k, p) λ^(k−p). */
    PLAIN,
    /** The same terms in another order. */
    SHUFFLED,
    SINE_AND_COSINE,
    /** A sine with a phase, or a cosine with a negative amplitude. */
    OTHER_PHASE,
    DEGREES,
    /** c λ^k and its conjugate. */
    COMPLEX_POWERS,
    /** |c| exp(iφ) r^k exp(iθk) and its conjugate. */
    COMPLEX_EXPONENTIALS,
    /** (−1)^k r^k for a negative base. */
    MINUS_ONE_POWER,
    SHIFTED_DOWN,
    SHIFTED_UP,
    COMMON_FACTOR,
    /** c λ^k in two parts. */
    SPLIT_TERM,
    RADICALS_OVER_ONE,
    RADICALS_UNDER_ROOT,
    RADICALS_BELOW,
    /** Polynomials in k before λ^k, multiplied out. */
    POLYNOMIAL_IN_K,
    /** (c0 + c1 k) λ^k. */
    POLYNOMIAL_OUTSIDE,
    /** exp(−a k) for a positive base. */
    EXPONENTIAL_BASE,
    /** c/b^k with b = 1/λ. */
    RECIPROCAL_BASE
}
