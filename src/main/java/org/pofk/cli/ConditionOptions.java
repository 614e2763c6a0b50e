package org.pofk.cli;

import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import org.pofk.answer.When.Condition;
import org.pofk.answer.WhenModel;
import org.pofk.chain.Model;
import org.pofk.chain.Output;
import org.pofk.report.Prose;
import org.pofk.report.ScheduledWhenDocument;
import org.pofk.report.Style;
import org.pofk.report.WhenDocument;
import org.pofk.schedule.ScheduledWhen;
import org.pofk.schedule.ScheduledWhen.Sides;
import picocli.CommandLine.Option;

/** Conditions on p(k). */
final class ConditionOptions {
    @Option(names = "--at-least", paramLabel = "VALUE", converter = Amount.Converter.class,
            description = "p(k) not below this: 0.99, 1/1000, 5%%")
    private Optional<Amount> atLeast = Optional.empty();

    @Option(names = "--at-most", paramLabel = "VALUE", converter = Amount.Converter.class,
            description = "p(k) not above this")
    private Optional<Amount> atMost = Optional.empty();

    @Option(names = "--settles-within", paramLabel = "VALUE", converter = Amount.Converter.class,
            description = "p(k) no farther than this from its long run; 1%% is a part of the long run")
    private Optional<Amount> settlesWithin = Optional.empty();

    @Option(names = "--side", paramLabel = "SIDE",
            description = {"with a schedule: p(k) before what is done at step k, after it, or both;",
                "after unless said otherwise (before, after, both)"})
    private Optional<Sides> side = Optional.empty();

    /** Which values of a step are meant. */
    Sides sides(Model read) throws UsageException {
        if (side.isPresent() && read.schedule().isEmpty()) {
            throw new UsageException("'" + read.origin().file() + "' has no schedule: before and after are one there;"
                    + " leave --side out");
        }
        return side.orElse(Sides.AFTER);
    }

    /** All that are given. */
    List<WhenModel.Asked> asked() throws UsageException {
        if (settlesWithin.filter(amount -> amount.value().signum() <= 0).isPresent()) {
            throw new UsageException("--settles-within takes a distance above zero, like 1e-6 or 1%");
        }
        return Stream.of(
                atLeast.map(amount -> new WhenModel.Asked(Condition.Kind.AT_LEAST, amount.value(), false)),
                atMost.map(amount -> new WhenModel.Asked(Condition.Kind.AT_MOST, amount.value(), false)),
                settlesWithin.map(amount -> new WhenModel.Asked(Condition.Kind.SETTLED, amount.value(),
                        amount.isPercent()))).flatMap(Optional::stream).toList();
    }

    /** What a report says of them. */
    List<AskedSection> sections(Model read, List<Output> outputs, Style style) throws UsageException {
        Sides sides = sides(read);
        return asked().stream().map(asked -> new AskedSection(Prose.of(WhenDocument.title(asked, style)),
                read.schedule().isPresent() ? () -> ScheduledWhenDocument.section(ScheduledWhen.of(read, outputs, asked,
                        sides, partly -> { }), style)
                : () -> WhenDocument.section(WhenModel.of(read, outputs, asked, partly -> { }), style))).toList();
    }
}
