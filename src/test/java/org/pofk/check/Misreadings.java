package org.pofk.check;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Random;
import java.util.Optional;
import org.pofk.chain.Chain;
import org.pofk.chain.Output;
import org.pofk.chain.SparseMatrix;
import org.pofk.exact.Rational;
import org.pofk.slip.SlipKind;

/** Wrong claims that are right of something else: another matrix, start or output, or what is left to one. */
final class Misreadings {
    private final Subject subject;
    private final Random random;
    private final List<Claimed> wrong = new ArrayList<>();
    private final List<Subject> starts = new ArrayList<>();

    private Misreadings(Subject subject, Random random) {
        this.subject = subject;
        this.random = random;
    }

    static List<Claimed> of(Subject subject, Random random) {
        Misreadings misreadings = new Misreadings(subject, random);
        if (subject.chain().kind() == Chain.Kind.CHAIN) {
            misreadings.transposed();
            misreadings.otherStart();
            misreadings.otherOutput();
            misreadings.complement();
            misreadings.forgottenMove();
            misreadings.exitFromTheAbsorbing();
            misreadings.rates();
        }
        return misreadings.wrong;
    }

    private Chain with(SparseMatrix matrix) {
        Chain chain = subject.chain();
        return new Chain(chain.kind(), chain.states(), matrix, chain.start(), chain.sets(), chain.outputs());
    }

    private Chain with(List<Rational> start) {
        Chain chain = subject.chain();
        return new Chain(chain.kind(), chain.states(), chain.matrix(), start, chain.sets(), chain.outputs());
    }

    private List<List<Rational>> rows() {
        int n = subject.chain().size();
        List<List<Rational>> rows = new ArrayList<>();
        for (int i = 0; i < n; i++) {
            List<Rational> row = new ArrayList<>();
            for (int j = 0; j < n; j++) {
                row.add(subject.chain().matrix().at(i, j));
            }
            rows.add(row);
        }
        return rows;
    }

    private void transposed() {
        List<List<Rational>> rows = rows();
        List<List<Rational>> turned = new ArrayList<>();
        for (int i = 0; i < rows.size(); i++) {
            int column = i;
            turned.add(rows.stream().map(row -> row.get(column)).toList());
        }
        Subject believed = subject.mistakenFor(new Chain(Chain.Kind.RECURSION, subject.chain().states(),
                SparseMatrix.ofRows(turned), subject.chain().start(), subject.chain().sets(),
                subject.chain().outputs()));
        Author author = new Author(subject, believed, List.of(SlipKind.MATRIX_TRANSPOSED), random);
        wrong.add(author.matrix(Style.EXACT));
        subject.outputs().stream().limit(2).forEach(output -> derived(author, believed, output, output));
    }

    private void otherStart() {
        int n = subject.chain().size();
        int state = random.nextInt(n);
        List<Rational> start = new ArrayList<>(Collections.nCopies(n, Rational.ZERO));
        start.set(state, Rational.ONE);
        Subject believed = subject.mistakenFor(with(start));
        Author author = new Author(subject, believed, List.of(SlipKind.START_MISREAD), random);
        if (!start.equals(subject.chain().start())) {
            wrong.add(author.start(Style.EXACT));
        }
        subject.outputs().stream().limit(2).forEach(output -> derived(author, believed, output, output));
    }

    private void otherOutput() {
        List<Output> outputs = subject.outputs();
        Author author = new Author(subject, subject, List.of(SlipKind.OUTPUT_MISREAD), random);
        for (int i = 0; i + 1 < outputs.size() && i < 2; i++) {
            if (!areComplements(outputs.get(i), outputs.get(i + 1))) {
                derived(author, subject, outputs.get(i), outputs.get(i + 1));
            }
        }
    }

    private boolean areComplements(Output a, Output b) {
        for (int i = 0; i < subject.chain().size(); i++) {
            if (!a.coefficients().get(i).plus(b.coefficients().get(i)).isOne()) {
                return false;
            }
        }
        return true;
    }

    private void complement() {
        Author author = new Author(subject, subject, List.of(SlipKind.COMPLEMENT_QUOTED), random);
        for (Output output : subject.outputs()) {
            boolean isProbability = output.coefficients().stream().allMatch(c -> c.isZero() || c.isOne());
            Output complement = new Output(output.name(), output.coefficients().stream()
                    .map(Rational.ONE::minus).toList(), Rational.ZERO, "complement");
            if (isProbability && !subject.modes(complement).poles().isEmpty()) {
                derived(author, subject, output, complement);
                value(author, output, complement);
            }
        }
    }

    /** A move out of a state that has several, given to staying where one is. */
    private void forgottenMove() {
        if (!subject.file().toString().matches(".*(pump-pair|seal-water|feeder-links|pressure-relief|deck).*")) {
            return;
        }
        List<List<Rational>> rows = rows();
        for (int j = 0; j < rows.size(); j++) {
            for (int i = j + 2; i < rows.size(); i++) {
                Rational forgotten = rows.get(i).get(j);
                if (!forgotten.isZero() && !rows.get(j).get(j).isZero()) {
                    List<List<Rational>> other = rows();
                    other.get(i).set(j, Rational.ZERO);
                    other.get(j).set(j, rows.get(j).get(j).plus(forgotten));
                    Subject believed = subject.mistakenFor(with(SparseMatrix.ofRows(other)));
                    Author author = new Author(subject, believed, List.of(SlipKind.TWO_EVENT_MOVE_FORGOTTEN), random);
                    wrong.add(author.matrix(Style.EXACT));
                    subject.outputs().stream().limit(3).forEach(output -> derived(author, believed, output, output));
                }
            }
        }
    }

    /** The exit of the state before, written for the state that is never left, too. */
    private void exitFromTheAbsorbing() {
        if (!subject.file().toString().matches(".*(crane-brake|pressure-relief).*")) {
            return;
        }
        List<List<Rational>> rows = rows();
        int last = rows.size() - 1;
        for (int target = 0; target < last; target++) {
            Rational exit = rows.get(target).get(last - 1);
            if (!exit.isZero() && target != last - 1) {
                List<List<Rational>> other = rows();
                other.get(target).set(last, exit);
                other.get(last).set(last, Rational.ONE.minus(exit));
                Subject believed = subject.mistakenFor(with(SparseMatrix.ofRows(other)));
                Author author = new Author(subject, believed, List.of(SlipKind.ABSORBING_STATE_LEFT), random);
                wrong.add(author.matrix(Style.EXACT));
                subject.outputs().stream().limit(3).forEach(output -> derived(author, believed, output, output));
            }
        }
    }

    /** Models with a parameter that is 1 − exp(−rate): the rate in its place. */
    private void rates() {
        if (!subject.file().toString().contains("resources/check")) {
            return;
        }
        for (org.pofk.chain.Model.Parameter parameter : subject.model().parameters()) {
            if (parameter.meaning().filter(meaning -> meaning.startsWith("1 - exp")).isPresent()) {
                String rate = parameter.meaning().orElseThrow().replaceAll("1 - exp\\(-([0-9.]+)\\).*", "$1");
                Subject believed = subject.withParameter(parameter.name(), new BigDecimal(rate));
                Author author = new Author(subject, believed, List.of(SlipKind.RATE_AS_PROBABILITY), random);
                subject.outputs().forEach(output -> derived(author, believed, output, output));
            }
        }
    }

    /** A value with enough digits to tell what it is a value of. */
    private void value(Author author, Output output, Output written) {
        Claimed claim = author.value(output, written, Style.significant(6));
        if (claim.yaml().matches(".*is: '-?[0-9]*\\.[0-9]*[1-9][0-9]*[1-9]'.*")) {
            wrong.add(claim);
        }
    }

    /** What a simpler mistake makes of it as well: none at all, a shift by a step, for an output another start. */
    private boolean isExplainedBefore(Author author, List<Near> believed, Output output) {
        List<Near> truth = subject.values(output);
        int last = truth.size() - 1;
        return areEqual(believed, truth)
                || areEqual(believed.subList(0, last), truth.subList(1, last + 1))
                || areEqual(believed.subList(1, last + 1), truth.subList(0, last))
                || author.slips().contains(SlipKind.OUTPUT_MISREAD) && starts().stream()
                        .anyMatch(other -> areEqual(believed, other.values(output)));
    }

    private List<Subject> starts() {
        if (starts.isEmpty()) {
            int n = subject.chain().size();
            for (int state = 0; state < n; state++) {
                List<Rational> start = new ArrayList<>(Collections.nCopies(n, Rational.ZERO));
                start.set(state, Rational.ONE);
                starts.add(subject.mistakenFor(with(start)));
            }
        }
        return starts;
    }

    /** A mistake that changes nothing is none. */
    private static boolean areEqual(List<Near> believed, List<Near> truth) {
        for (int k = 0; k < Math.min(truth.size(), 40); k++) {
            if (believed.get(k).differsFrom(truth.get(k))) {
                return false;
            }
        }
        return true;
    }

    /** A formula, a transform, a value and a long run of what is believed. */
    private void derived(Author author, Subject believed, Output output, Output written) {
        Modes modes = believed.modes(written);
        if (modes.poles().isEmpty() || isExplainedBefore(author, believed.values(written), output)) {
            return;
        }
        Style style = RightClaims.style(modes, random);
        author.formula(output, written, style, random.nextBoolean() ? Notation.PLAIN : Notation.SHUFFLED)
                .ifPresent(wrong::add);
        TransformWriter.Shape shape = TransformWriter.Shape.values()[random.nextInt(4)];
        author.transform(output, written, style, shape).ifPresent(wrong::add);
        if (random.nextInt(3) == 0) {
            value(author, output, written);
        }
        Optional<Claimed> longRun = believed.chain().kind() == Chain.Kind.CHAIN && random.nextInt(3) == 0
                ? author.longRun(output, written, Style.significant(6)) : Optional.empty();
        longRun.ifPresent(wrong::add);
    }

}
