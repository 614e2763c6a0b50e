package org.pofk.slip;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.pofk.claim.AuthorText;
import org.pofk.formula.Formula;
import org.pofk.formula.ParsedFormula;

/**
 * What stands where in a formula in k or z: its terms, its numbers with the part each plays, its powers of k, its
 * cosines and sines, and where k stands. In order of reading.
 */
final class FormulaSurvey {
    /** The part a number plays. */
    enum Role {
        /** Multiplies, or is added. */
        COEFFICIENT,
        /** Is raised to a power that depends on k, or stands below z. */
        POLE,
        /** Multiplies k in a cosine or sine. */
        ANGLE,
        /** Is added in a cosine or sine. */
        PHASE,
        /** Stands in an exponent or an impulse. */
        SHIFT
    }

    /** A part of the formula that doesn't vary; {@code term} is the term it belongs to. */
    record Constant(ParsedFormula node, Role role, ParsedFormula term) {
        boolean isLiteral() {
            return node.formula() instanceof Formula.Number || node.formula() instanceof Formula.WrittenDecimal;
        }
    }

    /** A term of some sum, or the whole; {@code index} is its place in {@code sum}. */
    record Term(ParsedFormula node, Optional<ParsedFormula> sum, int index, Role role) {
        /** The term without its sign. */
        ParsedFormula unsigned() {
            ParsedFormula inner = node;
            while (inner.formula() instanceof Formula.Negation) {
                inner = inner.parts().get(0);
            }
            return inner;
        }

        boolean isNegative() {
            return node.formula() instanceof Formula.Negation;
        }
    }

    private final List<Term> terms = new ArrayList<>();
    private final List<Constant> literals = new ArrayList<>();
    private final List<Constant> fractions = new ArrayList<>();
    private final List<ParsedFormula> powers = new ArrayList<>();
    private final List<ParsedFormula> waves = new ArrayList<>();
    private final List<ParsedFormula> steps = new ArrayList<>();
    private final List<ParsedFormula> signs = new ArrayList<>();

    private FormulaSurvey() {
    }

    static FormulaSurvey of(ParsedFormula tree) {
        FormulaSurvey survey = new FormulaSurvey();
        if (!(tree.formula() instanceof Formula.Sum)) {
            survey.terms.add(new Term(tree, Optional.empty(), 0, Role.COEFFICIENT));
        }
        survey.visit(tree, Role.COEFFICIENT, tree, false);
        return survey;
    }

    private void visit(ParsedFormula node, Role role, ParsedFormula term, boolean withinConstant) {
        Formula formula = node.formula();
        boolean constant = !AuthorText.varies(node);
        if (constant && !withinConstant && isCompound(node)) {
            fractions.add(new Constant(node, role, term));
        }
        if (formula instanceof Formula.Number || formula instanceof Formula.WrittenDecimal) {
            literals.add(new Constant(node, role, term));
        } else if (formula instanceof Formula.Symbol) {
            steps.add(node);
        } else if (formula instanceof Formula.Sum) {
            visitSum(node, role, term, constant);
        } else if (formula instanceof Formula.Power) {
            visitPower(node, role, term, constant);
        } else if (formula instanceof Formula.Quotient && AuthorText.varies(node.parts().get(1))) {
            visit(node.parts().get(0), role, term, constant);
            visit(node.parts().get(1), role == Role.COEFFICIENT ? Role.POLE : role, term, constant);
        } else if (formula instanceof Formula.Call call) {
            visitCall(node, call, role, term, constant);
        } else {
            boolean sign = formula instanceof Formula.Negation;
            if (sign) {
                signs.add(node);
            }
            node.parts().forEach(part -> visit(part, role, term, sign ? withinConstant : constant));
        }
    }

    private static boolean isCompound(ParsedFormula node) {
        return !(node.formula() instanceof Formula.Negation) && !node.parts().isEmpty();
    }

    private void visitSum(ParsedFormula node, Role role, ParsedFormula term, boolean constant) {
        for (int i = 0; i < node.parts().size(); i++) {
            ParsedFormula part = node.parts().get(i);
            Role its = role == Role.ANGLE && !AuthorText.varies(part) && !constant ? Role.PHASE : role;
            if (role != Role.SHIFT) {
                terms.add(new Term(part, Optional.of(node), i, its));
            }
            visit(part, its, role == Role.COEFFICIENT ? part : term, constant);
        }
    }

    private void visitPower(ParsedFormula node, Role role, ParsedFormula term, boolean constant) {
        ParsedFormula base = node.parts().get(0);
        ParsedFormula exponent = node.parts().get(1);
        boolean ofStep = AuthorText.varies(exponent);
        if (ofStep) {
            powers.add(node);
        }
        visit(base, ofStep ? Role.POLE : role, term, constant);
        visit(exponent, Role.SHIFT, term, constant);
    }

    private void visitCall(ParsedFormula node, Formula.Call call, Role role, ParsedFormula term, boolean constant) {
        boolean wave = call.function() == Formula.Function.COS || call.function() == Formula.Function.SIN;
        boolean varies = AuthorText.varies(node);
        if (wave && varies) {
            waves.add(node);
        }
        Role its = wave && varies ? Role.ANGLE
                : call.function() == Formula.Function.BINOMIAL || call.function() == Formula.Function.DELTA
                        ? Role.SHIFT : role;
        node.parts().forEach(part -> visit(part, its, term, constant));
    }

    /** Operands of sums outside exponents, those of sums within a factor too; the whole where it is no sum. */
    List<Term> terms() {
        return terms;
    }

    /** Terms outside cosines and sines. */
    List<Term> summands() {
        return terms.stream().filter(term -> term.role() == Role.COEFFICIENT).toList();
    }

    /** Single numbers. */
    List<Constant> literals() {
        return literals;
    }

    /** Largest parts that don't vary and are more than a single number: 4/9, sqrt(2)/3. */
    List<Constant> fractions() {
        return fractions;
    }

    /** Powers whose exponent depends on k. */
    List<ParsedFormula> powers() {
        return powers;
    }

    /** Cosines and sines that depend on k. */
    List<ParsedFormula> waves() {
        return waves;
    }

    /** Every place where the variable stands. */
    List<ParsedFormula> steps() {
        return steps;
    }

    /** Minus signs. */
    List<ParsedFormula> signs() {
        return signs;
    }
}
