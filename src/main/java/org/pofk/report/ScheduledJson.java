package org.pofk.report;

import java.util.List;
import java.util.Optional;
import java.util.function.BiConsumer;
import org.pofk.answer.Known;
import org.pofk.chain.Model;
import org.pofk.chain.Schedule;
import org.pofk.chain.Schedule.Repeat;
import org.pofk.chain.Schedule.When;
import org.pofk.chain.Timetable;
import org.pofk.exact.Rational;
import org.pofk.formula.Formula;
import org.pofk.formula.Latex;
import org.pofk.formula.PlainText;
import org.pofk.formula.Renaming;
import org.pofk.modes.ClosedForm;
import org.pofk.schedule.CycleCourse;
import org.pofk.schedule.CycleCourse.Reading;
import org.pofk.schedule.CycleCourse.Side;
import org.pofk.schedule.CycleFormula;
import org.pofk.schedule.JointFormula;
import org.pofk.schedule.PeriodicRegime;
import org.pofk.schedule.ScheduledModel;
import org.pofk.schedule.ScheduledOutput;
import org.pofk.schedule.StretchFormula;
import org.pofk.steps.KnownValue;

/** What {@code derive} found about a model with a schedule, as JSON: format {@code pofk-schedule}. */
public final class ScheduledJson {
    private final Json json;
    private final int digits;
    private final ScheduledModel found;

    private ScheduledJson(Json json, int digits, ScheduledModel found) {
        this.json = json;
        this.digits = digits;
        this.found = found;
    }

    /** The text; {@code digits} are the significant digits of decimals. */
    public static String write(ScheduledModel found, Optional<Known> known, int digits) {
        return Json.ofObject(json -> new ScheduledJson(json, digits, found).fields(known));
    }

    private void fields(Optional<Known> known) {
        JsonHead.write(json, "pofk-schedule", "derive", found.model());
        new JsonGiven(json).write(known);
        json.object("schedule", () -> schedule(found.model().schedule().orElseThrow()));
        json.list("outputs", found.outputs(), this::output);
    }

    private void schedule(Schedule schedule) {
        json.count("before", found.timetable().before());
        json.count("cycle", found.timetable().period());
        json.list("actions", schedule.recurring(), each -> json.object(() -> {
            json.text("do", each.action().name());
            json.count("every", each.every());
            json.count("first", each.first());
            json.text("when", each.when() == When.AFTER_THE_STEP ? "after the step" : "instead of the step");
        }));
        json.optional("phases", schedule.phases(), phases -> json.list(phases.list(), phase -> json.object(() -> {
            json.count("for", phase.steps());
            json.text("use", phase.use());
        })));
        json.text("repeat", schedule.phases().map(phases -> phases.repeat() == Repeat.YES ? "yes" : "once"));
    }

    void output(ScheduledOutput output) {
        json.object(() -> {
            json.text("name", output.output().name());
            json.text("word", word(output));
            json.optional("preamble", output.preamble(), course -> json.object(() -> summary(course)));
            json.optional("firstCycle", output.first(), course -> json.object(() -> summary(course)));
            json.optional("longRun", output.regime(), this::regime);
            json.list("within", output.within(), this::within);
            json.list("overCycles", output.over(), this::over);
            json.optional("joint", output.joint(), this::joint);
            json.list("values", output.values(), reading -> reading(reading, "k"));
        });
    }

    private static String word(ScheduledOutput output) {
        if (output.first().isEmpty() || output.regime().isEmpty()) {
            return "undecided";
        }
        boolean isExact = output.first().get().average().word() == KnownValue.Word.EXACT
                && output.regime().get().accept(new PeriodicRegime.Visitor<Boolean>() {
                    @Override
                    public Boolean recurring(PeriodicRegime.Recurring recurring) {
                        return recurring.course().average().word() == KnownValue.Word.EXACT;
                    }

                    @Override
                    public Boolean none(PeriodicRegime.None none) {
                        return true;
                    }
                });
        return isExact ? "exact" : "certified";
    }

    private void summary(CycleCourse course) {
        value("average", course.average());
        extreme("highest", course.highest());
        extreme("lowest", course.lowest());
    }

    void extreme(String name, CycleCourse.Extreme extreme) {
        json.object(name, () -> {
            json.count("j", extreme.j());
            json.text("side", extreme.side() == Side.BEFORE ? "before" : "after");
            value("value", extreme.value());
        });
    }

    void value(String name, KnownValue value) {
        json.name(name);
        value(value);
    }

    void value(KnownValue value) {
        json.object(() -> {
            json.text("word", value.word() == KnownValue.Word.EXACT ? "exact" : "certified");
            json.text("exact", value.exact().map(Rational::toString));
            json.text("decimal", KnownText.number(value, digits));
        });
    }

    private void regime(PeriodicRegime regime) {
        json.object(regime.accept(new PeriodicRegime.Visitor<Runnable>() {
            @Override
            public Runnable recurring(PeriodicRegime.Recurring recurring) {
                return () -> {
                    json.text("kind", "recurring");
                    json.count("cycles", recurring.cycles());
                    summary(recurring.course());
                    json.list("steps", recurring.course().readings(), reading -> reading(reading, "j"));
                };
            }

            @Override
            public Runnable none(PeriodicRegime.None none) {
                return () -> {
                    json.text("kind", "none");
                    json.text("reason", none.explanation());
                };
            }
        }));
    }

    private void reading(Reading reading, String step) {
        json.object(() -> {
            json.count(step, reading.j());
            value("before", reading.before());
            value("after", reading.after());
        });
    }

    private void within(StretchFormula formula) {
        json.object(() -> {
            json.text("cycle", formula.cycle() == StretchFormula.Cycle.FIRST ? "first" : "long run");
            json.count("from", formula.from());
            json.count("to", formula.to());
            formula(formula.closedForm(), "j");
        });
    }

    /** Other results about such a model: {@code fields} stand behind the head and the schedule. */
    static String write(String command, Model model, Timetable timetable, int digits,
            BiConsumer<Json, ScheduledJson> fields) {
        return write(command, command, model, timetable, digits, fields);
    }

    /** The same with a format named otherwise than the command. */
    static String write(String format, String command, Model model, Timetable timetable, int digits,
            BiConsumer<Json, ScheduledJson> fields) {
        return Json.ofObject(json -> {
            ScheduledJson writer = new ScheduledJson(json, digits,
                    new ScheduledModel(model, timetable, List.of(), false));
            JsonHead.write(json, "pofk-schedule-" + format, command, model);
            json.object("schedule", () -> writer.schedule(model.schedule().orElseThrow()));
            fields.accept(json, writer);
        });
    }

    void over(CycleFormula formula) {
        json.object(() -> {
            json.optional("j", formula.place(), place -> json.count(place.j()));
            json.text("side", formula.place().map(place -> place.side() == Side.BEFORE ? "before" : "after"));
            formula(formula.closedForm(), "m");
            json.name("longRun");
            new JsonLongRun(json).write(formula.longRun());
            json.object("proof", () -> {
                json.count("order", formula.closedForm().transform().proof().order());
                json.count("comparedSteps", formula.closedForm().transform().proof().comparedSteps());
            });
        });
    }

    private void joint(JointFormula formula) {
        json.object(() -> {
            json.count("to", formula.to());
            text("formula", FormulaInSteps.joint(formula, Prose.EMPTY).right());
        });
    }

    private void formula(ClosedForm form, String variable) {
        JsonNumbers numbers = new JsonNumbers(json, digits);
        json.text("variable", variable);
        json.object("transform", () -> {
            numbers.polynomial("numerator", form.transform().y().numerator());
            numbers.polynomial("denominator", form.transform().y().denominator());
        });
        Optional<Formula> shown = form.exactFormula().or(() -> form.decimalForm(digits).formula())
                .map(formula -> Renaming.of(formula, "k", variable));
        json.optional("formula", shown, formula -> json.object(() -> {
            json.text("text", PlainText.ASCII.write(formula));
            json.text("latex", Latex.write(formula));
        }));
    }

    private void text(String name, Formula formula) {
        json.object(name, () -> {
            json.text("text", PlainText.ASCII.write(formula));
            json.text("latex", Latex.write(formula));
        });
    }
}
