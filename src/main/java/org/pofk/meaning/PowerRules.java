package org.pofk.meaning;

/** A whole power, neither 0 nor 1, of a quantity: folded where the base is plain. Exact. */
final class PowerRules implements Node.Visitor<Quantity> {
    private final Quantity base;
    private final int exponent;

    PowerRules(Quantity base, int exponent) {
        this.base = base;
        this.exponent = exponent;
    }

    private Quantity asWritten() {
        return Quantity.of(new Node.Power(base, exponent));
    }

    @Override
    public Quantity number(Node.Number number) {
        boolean folds = Quantity.foldsToPower(number.value(), exponent)
                && (exponent > 0 || !number.value().isZero());
        return folds ? Quantity.of(number.value().pow(exponent)) : asWritten();
    }

    @Override
    public Quantity decimal(Node.Decimal decimal) {
        return asWritten();
    }

    @Override
    public Quantity root(Node.AtRoot root) {
        return asWritten();
    }

    @Override
    public Quantity constant(Node.Constant constant) {
        if (constant == Node.Constant.PI) {
            return asWritten();
        }
        return switch (Math.floorMod(exponent, 4)) {
            case 0 -> Quantity.ONE;
            case 1 -> Quantity.i();
            case 2 -> Quantity.of(-1);
            default -> Quantity.i().negate();
        };
    }

    @Override
    public Quantity sum(Node.Sum sum) {
        return asWritten();
    }

    @Override
    public Quantity product(Node.Product product) {
        return product.first().pow(exponent).times(product.second().pow(exponent));
    }

    @Override
    public Quantity power(Node.Power power) {
        long whole = (long) power.exponent() * exponent;
        return whole == (int) whole ? power.base().pow((int) whole) : asWritten();
    }

    /** A root to a multiple of its degree is a power. */
    @Override
    public Quantity radical(Node.Radical radical) {
        return exponent % radical.degree() == 0
                ? radical.radicand().pow(exponent / radical.degree())
                : asWritten();
    }

    @Override
    public Quantity exponential(Node.Exponential exponential) {
        return Quantity.of(exponent).times(exponential.exponent()).exponential();
    }

    @Override
    public Quantity logarithm(Node.Logarithm logarithm) {
        return asWritten();
    }

    @Override
    public Quantity angle(Node.Angle angle) {
        return asWritten();
    }

    @Override
    public Quantity conjugate(Node.Conjugate conjugate) {
        return asWritten();
    }

    @Override
    public Quantity realPart(Node.RealPart realPart) {
        return asWritten();
    }
}
