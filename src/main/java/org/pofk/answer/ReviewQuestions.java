package org.pofk.answer;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.stream.Collectors;
import org.pofk.chain.Chain;
import org.pofk.chain.Model;
import org.pofk.chain.SparseMatrix;
import org.pofk.chain.Structure;
import org.pofk.chain.Structure.CommunicatingClass;
import org.pofk.exact.Rational;

/** Collects the questions a model raises. Lives for one model. */
final class ReviewQuestions {
    private static final int NAMED_AT_MOST = 5;

    private final Model model;
    private final Chain chain;
    private final Structure structure;
    private final List<Question> questions = new ArrayList<>();

    private ReviewQuestions(Model model, Structure structure) {
        this.model = model;
        this.chain = model.chain();
        this.structure = structure;
    }

    static List<Question> of(Model model, Structure structure, List<NearlyClosed> nearlyClosed) {
        ReviewQuestions review = new ReviewQuestions(model, structure);
        review.askAboutReach();
        if (model.chain().kind() == Chain.Kind.CHAIN) {
            review.askAboutLeaving(nearlyClosed);
            review.askAboutLongRun(nearlyClosed);
        }
        review.askAboutEntry();
        return review.questions.stream().sorted(Comparator.comparing(Question::kind)).toList();
    }

    private void askAboutReach() {
        if (!structure.unreached().isEmpty()) {
            ask(Question.Kind.NEVER_REACHED, "from the start " + named(structure.unreached())
                    + " can't be reached: is a move missing, or another start meant?", structure.unreached());
        }
    }

    private void askAboutLeaving(List<NearlyClosed> nearlyClosed) {
        List<Integer> neverLeft = structure.absorbing();
        // with one state there is nothing to leave it for; a schedule may lead out of any
        if (!neverLeft.isEmpty() && chain.size() > 1 && model.schedule().isEmpty()) {
            ask(Question.Kind.NEVER_LEFT, named(neverLeft) + " can't be left: is there no repair, renewal or restart?",
                    neverLeft);
        }
        for (int state = 0; state < chain.size(); state++) {
            Rational staying = chain.matrix().at(state, state);
            Rational leaving = Rational.ONE.minus(staying);
            boolean isHardlyLeft = leaving.signum() > 0 && leaving.compareTo(NearlyClosed.HARDLY) < 0;
            // a state to start in may well be a good one; one to end in is the question
            List<Integer> alone = List.of(state);
            boolean isAskedAbout = nearlyClosed.stream().anyMatch(each -> each.states().equals(alone));
            if (isHardlyLeft && chain.start().get(state).isZero() && !isAskedAbout) {
                ask(Question.Kind.HARDLY_LEFT, named(alone) + " is left with a chance of only " + leaving
                        + " a step: is it meant to have an exit at all?", alone);
            }
        }
    }

    private void askAboutLongRun(List<NearlyClosed> nearlyClosed) {
        if (model.schedule().isPresent()) {
            return; // what is done, or another phase, may lead out of any closed class and make any period
        }
        List<CommunicatingClass> closed = structure.closedClasses().stream().filter(CommunicatingClass::reached)
                .toList();
        if (closed.size() > 1) {
            ask(Question.Kind.DEPENDS_ON_START, "the chain can end in " + closed.size()
                    + " different ways and the long run depends on the start: is the start the one meant?", List.of());
        }
        for (CommunicatingClass each : closed) {
            if (each.period() > 1) {
                ask(Question.Kind.PERIODIC, named(each.states()) + " take strict turns with period " + each.period()
                        + " and never settle: do the moves really never slip a step?", each.states());
            }
        }
        for (NearlyClosed each : nearlyClosed) {
            String verb = each.states().size() == 1 ? " is" : " are";
            ask(Question.Kind.SETTLES_LATE, named(each.states()) + verb + " left with a chance of at most "
                    + each.leavingAtMost() + " a step, so the long run is reached late: is the long run what matters?",
                    each.states());
        }
    }

    private void askAboutEntry() {
        List<Model.Adjustment> changes = model.changes().stream().filter(Model.Adjustment::isChange).toList();
        if (!changes.isEmpty()) {
            ask(Question.Kind.CHANGED_ON_ENTRY, changes.size() + " changed on entry (" + changes.get(0).text()
                    + "): is that what the author meant?", List.of());
        }
        boolean anySource = model.notes().stream().anyMatch(note -> note.kind() == Model.Remark.Kind.SOURCE)
                || model.parameters().stream().anyMatch(parameter -> parameter.source().isPresent());
        long inner = inner();
        if (!anySource && inner > 0) {
            boolean isChain = chain.kind() == Chain.Kind.CHAIN;
            String one = isChain ? "probability" : "coefficient";
            String many = isChain ? "probabilities" : "coefficients";
            ask(Question.Kind.WITHOUT_SOURCE, "no number names a source: where "
                    + (inner == 1 ? "does the " + one + " come from?" : "do the " + inner + " " + many + " come from?"),
                    List.of());
        }
        model.parameters().stream().filter(parameter -> anySource && parameter.source().isEmpty()
                && parameter.definition().isEmpty()).forEach(parameter -> ask(Question.Kind.WITHOUT_SOURCE,
                "parameter " + parameter.name() + " names no source: where does " + parameter.value()
                        + " come from?", List.of()));
        if (model.about().assumptions().isEmpty()) {
            ask(Question.Kind.WITHOUT_ASSUMPTIONS, "no assumptions are stated: which are made?", List.of());
        }
    }

    /** How many numbers of the matrix are none that a structure gives by itself. */
    private long inner() {
        return chain.matrix().columns().stream().flatMap(List::stream).map(SparseMatrix.Entry::value)
                .filter(value -> !value.isOne()).count();
    }

    private void ask(Question.Kind kind, String text, List<Integer> states) {
        questions.add(new Question(kind, text, states));
    }

    /** {@code 'both', 'one' and 3 more}. */
    private String named(List<Integer> states) {
        int shown = states.size() <= NAMED_AT_MOST + 1 ? states.size() : NAMED_AT_MOST;
        List<String> names = states.subList(0, shown).stream().map(state -> "'" + chain.states().get(state) + "'")
                .collect(Collectors.toCollection(ArrayList::new));
        if (shown < states.size()) {
            names.add(states.size() - shown + " more");
        }
        String last = names.remove(names.size() - 1);
        return names.isEmpty() ? last : String.join(", ", names) + " and " + last;
    }
}
