package org.pofk.schedule;

import org.pofk.answer.Constraint;
import org.pofk.answer.When.Condition;
import org.pofk.schedule.CycleFormula.Place;
import org.pofk.steps.KnownValue;

/** A condition on an output at the places of the cycles of a schedule: what it says of the numbers m of the cycles. */
interface CycleConditions {

    Condition condition();

    /** At step j of cycle m, as a sequence in m. */
    Constraint at(Place place);

    /** What that tends to at the cycles m ≡ residue. */
    KnownValue limit(Place place, long residue);
}
