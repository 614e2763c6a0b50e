package org.pofk.report;

import java.util.ArrayList;
import java.util.List;
import org.pofk.formula.Formula;

/**
 * Running text with names and formulas in it, each marked as what it is: a writer may spell our words as its format
 * needs, formulas as mathematics, and must leave names as their author wrote them. Canonical form: no empty words.
 */
public record Prose(List<Part> parts) {
    public static final Prose EMPTY = new Prose(List.of());

    /** A piece of running text; each writer handles every variant. */
    public sealed interface Part {
        <R> R accept(Visitor<R> visitor);
    }

    /** One method per variant. */
    public interface Visitor<R> {
        R words(Words words);

        R name(Name name);

        R mathematics(Mathematics mathematics);
    }

    /** Words of ours, blanks at the ends included. */
    public record Words(String text) implements Part {
        @Override
        public <R> R accept(Visitor<R> visitor) {
            return visitor.words(this);
        }
    }

    /** What a user named or wrote: a state, an output, a file, a title. */
    public record Name(String text) implements Part {
        @Override
        public <R> R accept(Visitor<R> visitor) {
            return visitor.name(this);
        }
    }

    /** A formula within a line. */
    public record Mathematics(Formula formula) implements Part {
        @Override
        public <R> R accept(Visitor<R> visitor) {
            return visitor.mathematics(this);
        }
    }

    public Prose {
        parts = parts.stream().filter(part -> !part.equals(new Words(""))).toList();
    }

    public static Prose of(String words) {
        return EMPTY.and(words);
    }

    public static Prose name(String name) {
        return EMPTY.andName(name);
    }

    public static Prose formula(Formula formula) {
        return EMPTY.andFormula(formula);
    }

    /** Names with commas between them. */
    public static Prose names(List<String> names) {
        return joined(names.stream().map(Prose::name).toList(), ", ");
    }

    /** All of them with the same words between each two. */
    public static Prose joined(List<Prose> all, String between) {
        Prose result = EMPTY;
        for (int i = 0; i < all.size(); i++) {
            result = result.and(i == 0 ? "" : between).and(all.get(i));
        }
        return result;
    }

    public Prose and(String words) {
        return with(List.of(new Words(words)));
    }

    public Prose andName(String name) {
        return with(List.of(new Name(name)));
    }

    public Prose andFormula(Formula formula) {
        return with(List.of(new Mathematics(formula)));
    }

    public Prose and(Prose other) {
        return with(other.parts);
    }

    private Prose with(List<Part> more) {
        List<Part> all = new ArrayList<>(parts);
        all.addAll(more);
        return new Prose(all);
    }

    public boolean isEmpty() {
        return parts.isEmpty();
    }
}
