package org.pofk.check;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Optional;
import java.util.Random;
import org.pofk.chain.Output;

/** Right claims about one model: every kind of step, exact and rounded, in many notations. */
final class RightClaims {
    private final Subject subject;
    private final Random random;
    private final int formulas;
    private final Author author;

    private RightClaims(Subject subject, int formulas, Random random) {
        this.subject = subject;
        this.random = random;
        this.formulas = formulas;
        this.author = new Author(subject, random);
    }

    /** With so many formulas an output. */
    static List<Claimed> of(Subject subject, int formulas, Random random) {
        return new RightClaims(subject, formulas, random).written();
    }

    private List<Claimed> written() {
        List<Claimed> claims = new ArrayList<>();
        claims.add(author.start(Style.EXACT));
        claims.add(author.matrix(Style.EXACT));
        if (subject.chain().size() <= 8) {
            claims.add(author.characteristicPolynomial(random.nextBoolean() ? Style.EXACT : Style.significant(7)));
        }
        author.longRuns(Style.EXACT).ifPresent(claims::add);
        author.longRuns(Style.significant(4 + random.nextInt(4))).ifPresent(claims::add);
        subject.outputs().forEach(output -> about(output, claims));
        return claims;
    }

    private void about(Output output, List<Claimed> claims) {
        List<Notation> notations = new ArrayList<>(List.of(Notation.values()));
        Collections.shuffle(notations, random);
        int written = 0;
        for (Notation notation : notations) {
            Style style = style(output);
            Optional<Claimed> claim = author.formula(output, output, random.nextInt(4) == 0 && !style.isExact()
                    ? new Style(style.kind(), style.digits(), true) : style, notation);
            claim.ifPresent(claims::add);
            written += claim.isPresent() ? 1 : 0;
            if (written == formulas) {
                break;
            }
        }
        author.formulaWithoutImpulses(output, style(output), Notation.PLAIN).ifPresent(claims::add);
        approximate(output).ifPresent(claims::add);
        List<TransformWriter.Shape> shapes = new ArrayList<>(List.of(TransformWriter.Shape.values()));
        Collections.shuffle(shapes, random);
        shapes.stream().limit(3).forEach(shape ->
                author.transform(output, output, style(output), shape).ifPresent(claims::add));
        author.poles(output, output, style(output)).ifPresent(claims::add);
        author.residues(output, style(output)).ifPresent(claims::add);
        author.pair(output, style(output)).ifPresent(claims::add);
        claims.add(author.value(output, output, style(output)));
        author.longRun(output, output, style(output)).ifPresent(claims::add);
        author.bound(output).ifPresent(claims::add);
    }

    private Style style(Output output) {
        return style(subject.modes(output), random);
    }

    /** A third exact; otherwise 3 to 10 digits, as many as it takes to tell the poles from each other and from one. */
    static Style style(Modes modes, Random random) {
        return random.nextInt(3) == 0 && modes.isExact() ? Style.EXACT : rounded(modes, random);
    }

    static Style rounded(Modes modes, Random random) {
        int least = Math.max(3, leastDigits(modes));
        int digits = Math.min(Math.max(10, least), least + random.nextInt(Math.max(1, 11 - least)));
        return new Style(random.nextInt(4) == 0 ? Style.Kind.DECIMALS : Style.Kind.SIGNIFICANT, digits, false);
    }

    private static int leastDigits(Modes modes) {
        List<Near> places = new ArrayList<>(List.of(Near.ONE));
        modes.poles().forEach(pole -> places.add(pole.lambda().value()));
        BigDecimal gap = BigDecimal.ONE;
        for (int i = 0; i < places.size(); i++) {
            for (int j = i + 1; j < places.size(); j++) {
                BigDecimal distance = places.get(i).minus(places.get(j)).upperModulus();
                gap = distance.signum() > 0 ? gap.min(distance) : gap;
            }
            gap = places.get(i).isReal() ? gap : gap.min(places.get(i).imaginary().abs());
        }
        return gap.scale() - gap.precision() + 3;
    }

    /** A coefficient off by a percent or so, and what that makes at most, which is claimed with some room. */
    private Optional<Claimed> approximate(Output output) {
        return Approximations.of(subject, output, author, Approximations.Room.ENOUGH, random);
    }
}
