package org.pofk.text;

/**
 * A place in a source text: line and column both count from 1, columns in code points.
 *
 * @param source name of the source as the user gave it, for example {@code deck.yaml}
 */
public record Position(String source, int line, int column) implements Comparable<Position> {

    /** The place that stands for a source as a whole, for faults that no single line causes. */
    public static Position ofWhole(String source) {
        return new Position(source, 0, 0);
    }

    /** True when this names the source and no line in it. */
    public boolean isWhole() {
        return line == 0;
    }

    @Override
    public int compareTo(Position other) {
        int bySource = source.compareTo(other.source);
        if (bySource != 0) {
            return bySource;
        }
        int byLine = Integer.compare(line, other.line);
        return byLine != 0 ? byLine : Integer.compare(column, other.column);
    }

    /** {@code deck.yaml:9:3}, or the source's name alone. */
    @Override
    public String toString() {
        return isWhole() ? source : source + ":" + line + ":" + column;
    }
}
