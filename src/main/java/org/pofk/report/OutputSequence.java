package org.pofk.report;

import java.util.List;
import java.util.stream.IntStream;
import org.pofk.exact.Polynomial;
import org.pofk.exact.Rational;
import org.pofk.report.Document.Sequence;
import org.pofk.steps.PowerSeries;
import org.pofk.transform.Transform;

/** An output's values as the recurrence that was proved for them. Exact. */
final class OutputSequence {
    private OutputSequence() {
    }

    static Sequence of(Transform transform) {
        Polynomial<Rational> recurrence = transform.recurrence();
        int order = recurrence.degree();
        return new Sequence(OutputProse.atStep(transform.output()),
                IntStream.range(0, order).mapToObj(recurrence::coefficient).toList(),
                order == 0 ? List.of() : PowerSeries.of(transform.y(), order - 1));
    }
}
