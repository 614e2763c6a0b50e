package org.pofk.cli;

import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.EnumSet;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import org.pofk.answer.DerivedModel;
import org.pofk.answer.Deriving;
import org.pofk.chain.Model;
import org.pofk.chain.Output;
import org.pofk.report.Chart;
import org.pofk.report.CourseChart;
import org.pofk.report.PngChart;
import org.pofk.report.PoleChart;
import org.pofk.report.StateChart;
import org.pofk.report.SvgChart;
import org.pofk.text.RefusedException;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;

/** {@code pofk draw MODEL}: a figure. */
@Command(description = {"Draws p(k) over steps, the poles of its transform, or the states and moves;",
    "with exact or certified values, and in words what is seen."})
final class DrawCommand implements Work {
    private static final int LEAST_WIDTH = 100;
    private static final int MOST_WIDTH = 10_000;
    private static final int WIDTH = 1440;

    @Mixin
    private ModelOptions model;

    @Option(names = "--what", paramLabel = "FIGURE", defaultValue = "course",
            description = "course (p(k) over steps), poles or states; ${DEFAULT-VALUE} otherwise")
    private Figure what;

    @Option(names = "--of", paramLabel = "NAME",
            description = "an output, a set or a state; repeatable; for course and poles")
    private List<String> of = new ArrayList<>();

    @Option(names = "--at", paramLabel = "STEPS", converter = StepList.Converter.class,
            description = "the steps of course, like 0..60; otherwise until the outputs have settled")
    private Optional<StepList> at = Optional.empty();

    @Option(names = "--width", paramLabel = "PIXELS",
            description = "of a .png, 100 to 10000; 1440 otherwise")
    private Optional<Integer> width = Optional.empty();

    @Mixin
    private SaveOptions save = new SaveOptions();

    @Mixin
    private RunOptions run;

    /** What can be drawn. */
    enum Figure {
        COURSE, POLES, STATES;

        @Override
        public String toString() {
            return Words.lowerCase(this);
        }
    }

    /** What a figure can be written as. */
    private enum Drawn { SVG, PNG }

    @Override
    public ExitCode run(Streams streams) throws RefusedException, UsageException, WritingException {
        Drawn drawn = drawn();
        checkOptions(drawn);
        save.check();
        Model read = model.readWithSchedule();
        Optional<Chart> chart = what == Figure.STATES ? Optional.of(states(read)) : ofOutputs(read, streams);
        if (chart.isEmpty()) {
            streams.notes().println("pofk: not everything to be drawn was found within the budget; nothing is written");
            return ExitCode.NOT_DECIDED;
        }
        save.write(drawn == Drawn.PNG ? PngChart.of(chart.get(), width.orElse(WIDTH))
                : SvgChart.file(chart.get()).getBytes(StandardCharsets.UTF_8), streams);
        return ExitCode.ANSWERED;
    }

    /** From the file's name; to the screen goes SVG, which is text. */
    private Drawn drawn() throws UsageException {
        if (save.file().isEmpty()) {
            return Drawn.SVG;
        }
        Path file = save.file().get();
        String name = file.toString().toLowerCase(Locale.ROOT);
        if (!name.endsWith(".svg") && !name.endsWith(".png")) {
            throw new UsageException("what is '" + file + "' to hold? Name it with an ending of .svg or .png");
        }
        return name.endsWith(".svg") ? Drawn.SVG : Drawn.PNG;
    }

    private void checkOptions(Drawn drawn) throws UsageException {
        if (at.isPresent() && what != Figure.COURSE) {
            throw new UsageException("--at chooses the steps of --what course; " + what + " have none");
        }
        if (!of.isEmpty() && what == Figure.STATES) {
            throw new UsageException("--of chooses what --what course and --what poles draw; states are all drawn");
        }
        if (width.isPresent() && drawn != Drawn.PNG) {
            throw new UsageException("--width is for a .png; an SVG is as wide as the room it is given");
        }
        if (width.filter(pixels -> pixels < LEAST_WIDTH || pixels > MOST_WIDTH).isPresent()) {
            throw new UsageException("--width " + width.get() + " is not possible; " + LEAST_WIDTH + " to " + MOST_WIDTH
                    + " pixels are");
        }
    }

    private static Chart states(Model read) throws UsageException {
        Optional<Chart.StateDiagram> diagram = StateChart.of(read);
        if (diagram.isEmpty()) {
            throw new UsageException("'" + read.origin().file() + "' has " + read.chain().size()
                    + " states; a diagram of more than " + StateChart.MOST_STATES + " can't be read.\nInstead:  pofk"
                    + " inspect MODEL  lists the classes they form; with a set or an output\nfor the states that matter, "
                    + " pofk draw MODEL --of NAME  draws p(k) of it");
        }
        return diagram.get();
    }

    private Optional<Chart> ofOutputs(Model read, Streams streams) throws UsageException {
        List<Output> outputs = AskedOutputs.of(read.chain(), of);
        if (outputs.size() > CourseChart.MOST_CURVES) {
            throw new UsageException("these are " + outputs.size() + " outputs; " + CourseChart.MOST_CURVES
                    + " at most can be told apart in a figure; name those that matter with --of");
        }
        if (read.schedule().isPresent() && what == Figure.POLES) {
            throw ScheduledDrawing.withoutPoles(read);
        }
        if (read.schedule().isPresent()) {
            return ScheduledDrawing.course(run, read, outputs, at, streams);
        }
        Worker.Outcome<Chart> outcome = run.within(streams, published -> {
            DerivedModel derived = Deriving.of(read, outputs, List.of(), EnumSet.noneOf(Deriving.Extra.class),
                    partly -> { });
            published.accept(what == Figure.COURSE
                    ? CourseChart.of(derived, at.map(StepList::steps).orElse(List.of())).orElseThrow()
                    : PoleChart.of(derived).orElseThrow());
        });
        return outcome.published();
    }
}
