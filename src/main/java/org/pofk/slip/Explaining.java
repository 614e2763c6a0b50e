package org.pofk.slip;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.stream.IntStream;
import org.pofk.claim.Answer;
import org.pofk.claim.AnswerOf;
import org.pofk.claim.AuthorText;
import org.pofk.claim.Claim;
import org.pofk.claim.FormulaText;
import org.pofk.claim.Judgement;
import org.pofk.claim.Judging;
import org.pofk.claim.Statement;
import org.pofk.claim.Truth;
import org.pofk.formula.Formula;

/**
 * Finds the slips that explain one wrong claim: every candidate that isn't refuted at a few points is judged as the
 * claim was, and those are slips that make it right. Deterministic; the work is bounded by a {@link Budget}.
 */
final class Explaining {
    private static final int MOST_PAIRS = 60;

    private final Claim claim;
    private final Judgement judgement;
    private final Truth truth;
    private final List<StatementPart> parts;
    private final List<Optional<AuthorText>> texts;
    private final List<Optional<Screen>> screens;
    private final List<Integer> wrongParts;
    private final Optional<PairScreen> pair;
    private final Budget budget = new Budget();

    private Explaining(Claim claim, Judgement judgement, Truth truth) {
        this.claim = claim;
        this.judgement = judgement;
        this.truth = truth;
        this.parts = StatementPart.of(claim.statement());
        this.texts = parts.stream().map(part -> AuthorText.of(part.text())).toList();
        this.screens = IntStream.range(0, parts.size()).mapToObj(part -> Screen.of(claim, part, truth)).toList();
        this.pair = PairScreen.of(claim, truth);
        this.wrongParts = IntStream.range(0, parts.size()).filter(part -> screens.get(part)
                .filter(screen -> !screen.mayBeRight(parts.get(part).text())).isPresent()).boxed().toList();
    }

    static Explanation of(Claim claim, Judgement judgement, Truth truth, OtherTruths others) {
        if (claim.statement() instanceof Statement.NoNumber) {
            return Explanation.NOTHING;
        }
        Explaining explaining = new Explaining(claim, judgement, truth);
        boolean hasNumber = !(claim.statement() instanceof AnswerOf asked)
                || truth.answer(asked).standing() != Answer.Standing.NONE;
        return hasNumber ? explaining.explained(others) : explaining.averaged(others);
    }

    /** Where no number is right, what explains one is that it is a mean over what never happens. */
    private Explanation averaged(OtherTruths others) {
        List<Candidate> found = others.of(claim, judgement.right()).stream()
                .filter(each -> each.kind() == SlipKind.NEVER_IS_AVERAGED && isRight(each)).toList();
        return new Explanation(Told.of(found, parts).stream().map(Candidate::slip).toList(), false, found,
                Optional.empty());
    }

    private Explanation explained(OtherTruths others) {
        List<Candidate> found = new ArrayList<>();
        List<Meaning> meanings = new ArrayList<>();
        List<Change> changes = new Changes(claim, judgement, truth, texts, screens).all().stream()
                .sorted(Comparator.comparing(Change::kind)).toList();
        for (Change change : changes) {
            if (!repeats(found, change) && budget.screening() && mayBeRight(change)) {
                Optional<Candidate> candidate = candidate(List.of(change));
                Optional<Meaning> meaning = candidate.map(each -> Meaning.of(each.claim()));
                if (candidate.isPresent() && !repeats(found, meanings, candidate.get(), meaning.get())
                        && isRight(candidate.get())) {
                    found.add(candidate.get());
                    meanings.add(meaning.get());
                }
            }
        }
        StructuralChanges.of(claim, truth).stream().filter(this::isRight).forEach(found::add);
        List<Candidate> models = others.of(claim, judgement.right()).stream()
                .filter(each -> budget.screening() && mayBeTrue(each) && isRight(each)).toList();
        models.stream().filter(model -> found.stream().noneMatch(each -> each.kind() == model.kind()))
                .forEach(found::add);
        if (found.stream().allMatch(Told::isMerelyWrong)) {
            Totals.of(claim, judgement.right(), truth).ifPresent(found::add);
        }
        List<Candidate> told = Told.of(found, parts);
        if (told.isEmpty()) {
            return together(changes);
        }
        // what follows from a claim follows from what explains it first
        return new Explanation(told.stream().map(Candidate::slip).toList(), false,
                models.stream().filter(model -> model.kind() == told.get(0).kind()).toList(), Optional.empty());
    }

    /** Whether the same place with the same value, or the same kind at the same place, is named already. */
    private static boolean repeats(List<Candidate> found, Change change) {
        return found.stream().anyMatch(each -> each.span().equals(change.span())
                && (each.kind() == change.kind() || each.right().equals(change.right())));
    }

    /** Whether what would be said is named already: by the same kind, or by a more telling one. */
    private static boolean repeats(List<Candidate> found, List<Meaning> meanings, Candidate candidate,
            Meaning meaning) {
        return IntStream.range(0, found.size()).anyMatch(i -> (found.get(i).kind() == candidate.kind()
                || Told.isMerelyWrong(candidate)) && meanings.get(i).isLike(meaning));
    }

    private boolean mayBeRight(Change change) {
        return change.edits().keySet().containsAll(wrongParts)
                && change.edits().keySet().stream().allMatch(part -> mayBeRight(change, part));
    }

    private boolean mayBeRight(Change change, int part) {
        Optional<FormulaText> text = texts.get(part).flatMap(own -> change.textOf(own, part));
        return text.isPresent() && pair.map(screen -> screen.mayBeRight(part, text.get())).orElse(true)
                && screens.get(part).map(screen -> screen.mayBeRight(text.get())).orElse(true);
    }

    private boolean mayBeTrue(Candidate candidate) {
        Truth other = candidate.truth().get();
        List<StatementPart> own = StatementPart.of(candidate.claim().statement());
        return IntStream.range(0, own.size()).allMatch(part -> Screen.of(candidate.claim(), part, other)
                .map(screen -> screen.mayBeRight(own.get(part).text())).orElse(true));
    }

    private boolean isRight(Candidate candidate) {
        return budget.judgement() && Judging.isRight(candidate.claim(), candidate.truth().get())
                && TightBound.isTight(candidate.claim(), candidate.truth().get());
    }

    private Optional<Candidate> candidate(List<Change> changes) {
        Change first = changes.get(0);
        return Change.made(claim.statement(), changes).map(statement -> new Candidate(first.kind(), first.span(),
                first.found(), first.right(), () -> StatementText.of(statement), Candidate.with(claim, statement), () -> truth));
    }

    /** Two slips, or one in each wrong part of the statement, that explain it together. */
    private Explanation together(List<Change> changes) {
        Optional<List<Change>> several = wrongParts.size() > 1 ? inEachPart(changes) : Optional.empty();
        if (several.isEmpty()) {
            several = new Pairs(texts, screens, changes, budget).found().stream().limit(MOST_PAIRS)
                    .filter(pair -> candidate(pair).filter(this::isRight).isPresent()).findFirst();
        }
        if (several.filter(chosen -> !replacesEveryNumber(chosen)).isEmpty()) {
            return new Explanation(List.of(), false, List.of(), Optional.of(Rest.of(claim, judgement, truth)));
        }
        List<Change> all = several.get();
        Candidate whole = candidate(all).orElseThrow();
        List<Slip> slips = all.stream().map(change -> new Slip(change.kind(), change.span(), change.found(),
                change.right(), whole.corrected().get())).toList();
        return new Explanation(slips, true, List.of(), Optional.empty());
    }

    /** Other numbers in all places explain nothing: any claim comes right by them. */
    private boolean replacesEveryNumber(List<Change> chosen) {
        return chosen.stream().allMatch(change -> change.kind() == SlipKind.WRONG_COEFFICIENT
                || change.kind() == SlipKind.WRONG_POLE)
                && parts.stream().flatMap(part -> part.text().parsed().nodes())
                .filter(node -> node.formula() instanceof Formula.WrittenDecimal
                        || node.formula() instanceof Formula.Number)
                .allMatch(node -> chosen.stream().anyMatch(change -> change.span().start().compareTo(node.span().start()) <= 0
                        && node.span().end().compareTo(change.span().end()) <= 0));
    }

    /** The simplest change of each wrong part that makes this part right. */
    private Optional<List<Change>> inEachPart(List<Change> changes) {
        List<Change> chosen = new ArrayList<>();
        for (int part : wrongParts) {
            Optional<Change> first = changes.stream().filter(change -> change.edits().keySet().equals(Set.of(part))
                    && budget.screening() && mayBeRight(change, part)).findFirst();
            if (first.isEmpty()) {
                return Optional.empty();
            }
            chosen.add(first.get());
        }
        return candidate(chosen).filter(this::isRight).isPresent() ? Optional.of(chosen) : Optional.empty();
    }
}
