package org.pofk.answer;

import java.util.List;
import java.util.Optional;
import org.pofk.answer.When.Condition;
import org.pofk.answer.When.End;
import org.pofk.chain.Chain;
import org.pofk.exact.Rational;
import org.pofk.longrun.LongRun;
import org.pofk.longrun.LongRunValues;
import org.pofk.modes.ClosedForm;

/** A sequence that has to lie in a band: where it does at a step or over stretches of steps, and how that ends. */
public interface Constraint {

    /** How a class of steps ends, and a step from which it does. */
    record Ending(End end, long from) {
    }

    /** A sequence with a closed form; empty where it has no long run that is a limit or a cycle. */
    static Optional<Constraint> of(Chain chain, ClosedForm form, LongRun longRun, Condition condition) {
        List<Rational> limits = LongRunValues.of(longRun);
        return limits.isEmpty() ? Optional.empty()
                : Optional.of(new ClosedFormConstraint(chain, form, limits, condition::around));
    }

    /** How many steps the long run recurs after: residues are those modulo a multiple of it. */
    int period();

    /** The least multiple of a stride, up to {@code most}, that makes the approach easier to decide. */
    long stride(long least, long most);

    /** How the steps k ≡ residue end; a step of another class is as good for {@code from}. */
    Ending ending(long residue, long modulus) throws TooMuchWorkException;

    /** At all steps low, low + modulus, … high of a class. */
    Band.Relation over(long residue, long low, long high, long modulus) throws TooMuchWorkException;

    /** At one step of a class: never either. */
    Band.Relation at(long residue, long k) throws TooMuchWorkException;
}
