package org.pofk.slip;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.pofk.chain.Model;
import org.pofk.chain.Output;
import org.pofk.claim.AnswerOf;
import org.pofk.claim.FormulaText;
import org.pofk.claim.OutputTruth;
import org.pofk.claim.Statement;
import org.pofk.claim.TruePole;
import org.pofk.claim.Truth;
import org.pofk.exact.Enclosed;
import org.pofk.exact.Rational;
import org.pofk.formula.Formula;
import org.pofk.longrun.LongRun;
import org.pofk.modes.Mode;
import org.pofk.modes.RealValue;
import org.pofk.slip.FormulaSurvey.Role;

/** The numbers that a right statement of some kind is made of, by the part they play. */
final class TrueNumbers {
    /** Above so many modes right values are only taken from the judgement. */
    private static final int MOST_MODES = 12;

    private TrueNumbers() {
    }

    /** Those that may stand in one part of a statement. */
    static List<TrueNumber> of(Statement statement, int part, Role role, Truth truth) {
        return statement.accept(new Kinds(part, role, truth));
    }

    /** Those of one role in the modes of the output that a statement is about. */
    static List<TrueNumber> ofRole(Statement statement, Role role, Truth truth) {
        return Outcomes.only(statement).map(output -> new Kinds(0, role, truth).modes(output, role)).orElse(List.of());
    }

    /** What an output's modes are made of. */
    private record ModeNumbers(Role role, List<TrueNumber> found) implements Mode.Visitor<Boolean> {
        private boolean add(RealValue value) {
            return found.add(new TrueNumber(value.exact(), value.enclosure()));
        }

        @Override
        public Boolean impulse(Mode.Impulse impulse) {
            return role == Role.COEFFICIENT && add(impulse.value());
        }

        @Override
        public Boolean geometric(Mode.Geometric mode) {
            return switch (role) {
                case COEFFICIENT -> add(mode.coefficient());
                case POLE -> add(mode.base());
                default -> false;
            };
        }

        @Override
        public Boolean oscillating(Mode.Oscillating mode) {
            return switch (role) {
                case COEFFICIENT -> add(mode.amplitude());
                case POLE -> add(mode.modulus());
                case ANGLE -> angle(mode.angle());
                case PHASE -> angle(mode.phase());
                case SHIFT -> false;
            };
        }

        private boolean angle(RealValue value) {
            add(value);
            return found.add(new TrueNumber(Optional.empty(), value.enclosure().times(Enclosed.of(Rational.of(180)))
                    .dividedBy(Enclosed.pi())));
        }
    }

    private record Kinds(int part, Role role, Truth truth) implements Statement.Visitor<List<TrueNumber>> {
        @Override
        public List<TrueNumber> start(Statement.Start start) {
            return List.of(TrueNumber.of(truth.chain().start().get(start.components().get(part).state())));
        }

        @Override
        public List<TrueNumber> matrix(Statement.Matrix matrix) {
            int i = 0;
            int j = part;
            while (j >= matrix.rows().get(i).size()) {
                j -= matrix.rows().get(i).size();
                i++;
            }
            int n = truth.chain().size();
            if (i >= n || j >= n) {
                return List.of();
            }
            return List.of(TrueNumber.of(matrix.convention() == Model.Convention.ROWS
                    ? truth.chain().matrix().at(j, i) : truth.chain().matrix().at(i, j)));
        }

        @Override
        public List<TrueNumber> polynomial(Statement.MatrixPolynomial polynomial) {
            return List.of();
        }

        @Override
        public List<TrueNumber> transform(Statement.TransformOf transform) {
            List<TrueNumber> numbers = new ArrayList<>();
            if (truth.about(transform.output()).closedForm().modes().size() <= MOST_MODES) {
                numbers.addAll(modes(transform.output(), Role.COEFFICIENT));
                numbers.addAll(modes(transform.output(), Role.POLE));
            }
            numbers.addAll(complex(transform.is(), transform.output(), Role.COEFFICIENT));
            numbers.addAll(complex(transform.is(), transform.output(), Role.POLE));
            return numbers;
        }

        @Override
        public List<TrueNumber> poles(Statement.Poles poles) {
            List<TrueNumber> numbers = new ArrayList<>(modes(poles.output(), Role.POLE));
            for (TruePole pole : truth.about(poles.output()).poles()) {
                if (!pole.isReal()) {
                    numbers.add(TrueNumber.realPart(pole.value()));
                    numbers.add(TrueNumber.imaginaryPart(pole.value()));
                }
            }
            return numbers;
        }

        @Override
        public List<TrueNumber> residues(Statement.Residues residues) {
            List<TrueNumber> numbers = new ArrayList<>(modes(residues.output(), Role.COEFFICIENT));
            numbers.addAll(modes(residues.output(), Role.POLE));
            for (TruePole pole : truth.about(residues.output()).poles()) {
                if (!pole.isReal()) {
                    numbers.add(TrueNumber.realPart(pole.value()));
                    numbers.add(TrueNumber.imaginaryPart(pole.value()));
                    pole.coefficients().forEach(each -> {
                        numbers.add(TrueNumber.realPart(each));
                        numbers.add(TrueNumber.imaginaryPart(each));
                    });
                }
            }
            return numbers;
        }

        @Override
        public List<TrueNumber> formula(Statement.PofK formula) {
            Statement.PofK.Part own = formula.parts().get(part);
            List<TrueNumber> numbers = new ArrayList<>(modes(own.output(), role));
            numbers.addAll(complex(own.is(), own.output(), role));
            return numbers;
        }

        @Override
        public List<TrueNumber> pair(Statement.Pair pair) {
            List<TrueNumber> numbers = new ArrayList<>();
            for (Role each : List.of(Role.POLE, Role.ANGLE, Role.PHASE, Role.COEFFICIENT)) {
                numbers.addAll(modes(pair.output(), each));
            }
            return numbers;
        }

        @Override
        public List<TrueNumber> longRun(Statement.LongRunOf longRun) {
            int left = part;
            for (Statement.LongRunOf.Part each : longRun.parts()) {
                if (left < each.values().size()) {
                    return longRun(truth.about(each.output()), left);
                }
                left -= each.values().size();
            }
            return List.of();
        }

        private static List<TrueNumber> longRun(OutputTruth about, int place) {
            return about.longRun().accept(new LongRun.Visitor<>() {
                @Override
                public List<TrueNumber> limit(LongRun.Limit limit) {
                    return List.of(TrueNumber.of(limit.value()));
                }

                @Override
                public List<TrueNumber> cycle(LongRun.Cycle cycle) {
                    return place < cycle.period() ? List.of(TrueNumber.of(cycle.values().get(place))) : List.of();
                }

                @Override
                public List<TrueNumber> none(LongRun.None none) {
                    return List.of();
                }
            });
        }

        @Override
        public List<TrueNumber> eigenvector(Statement.Eigenvector eigenvector) {
            return List.of();
        }

        @Override
        public List<TrueNumber> value(Statement.Value value) {
            return value.at() > OutputTruth.EXACT ? List.of()
                    : List.of(TrueNumber.of(truth.about(value.output()).valueAt(value.at())));
        }

        @Override
        public List<TrueNumber> bound(Statement.Bound bound) {
            return List.of();
        }

        @Override
        public List<TrueNumber> answer(AnswerOf answer) {
            return truth.answer(answer).exact().map(TrueNumber::of).stream().toList();
        }

        @Override
        public List<TrueNumber> noNumber(Statement.NoNumber noNumber) {
            return List.of();
        }

        /** Real and imaginary parts, for an author who writes them. */
        private List<TrueNumber> complex(FormulaText text, Output output, Role wanted) {
            List<Mode> modes = truth.about(output).closedForm().modes();
            boolean complex = text.parsed().nodes().anyMatch(node -> node.formula() == Formula.Constant.I);
            return !complex || modes.size() > MOST_MODES ? List.of()
                    : modes.stream().filter(Mode.Oscillating.class::isInstance)
                            .flatMap(mode -> PairTerms.numbers((Mode.Oscillating) mode, wanted).stream()).toList();
        }

        private List<TrueNumber> modes(Output output, Role wanted) {
            ModeNumbers numbers = new ModeNumbers(wanted, new ArrayList<>());
            List<Mode> modes = truth.about(output).closedForm().modes();
            if (modes.size() <= MOST_MODES) {
                modes.forEach(mode -> mode.accept(numbers));
            }
            return numbers.found();
        }
    }
}
