package org.pofk.input;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Random;
import java.util.Set;
import java.util.regex.Pattern;
import org.junit.jupiter.api.Test;
import org.pofk.chain.Chain;
import org.pofk.chain.ChainCheck;
import org.pofk.exact.Rational;
import org.pofk.text.Fault;
import org.pofk.text.RefusedException;

/**
 * Every model that comes with the program, changed at 200 seeded places. Each mutant is accepted with a right answer
 * (its moves are those of the mutated file by a second reading, and add up to one), or refused with a fault where the
 * change is. "Where the change is" means a line that the change touches; or else, where the fault shows elsewhere by
 * nature, one of:
 * <ul>
 * <li>the message names what stands on a touched line, a name that is used elsewhere, or says the line's number;</li>
 * <li>the fault stands at the entry that holds the touched line, further up and indented less;</li>
 * <li>the change broke the indentation, and the fault stands at the next line, which no longer fits.</li>
 * </ul>
 */
class MutationTest {
    private static final int PLACES = 200;
    private static final Set<String> OF_STRUCTURE = Set.of("indentation", "misplaced-colon");

    private int accepted;
    private int compared;
    private int onTheLine;
    private int elsewhereByNature;
    private final List<String> wrong = new ArrayList<>();

    @Test
    void everyMutantIsReadRightOrRefusedWhereItWasChanged() throws Exception {
        int mutants = 0;
        for (Path file : PatternModelsTest.models()) {
            String original = Files.readString(file);
            Random random = new Random(file.getFileName().toString().hashCode());
            for (int i = 0; i < PLACES; i++) {
                judge(file.getFileName().toString(), Mutation.of(original, random));
                mutants++;
            }
        }
        assertEquals(List.of(), wrong);
        assertTrue(mutants >= 3200, mutants + " mutants");
        assertTrue(accepted > mutants / 5 && onTheLine > mutants / 2, accepted + " accepted, " + onTheLine + " refused");
        assertTrue(compared > 10 * accepted, compared + " entries compared");
        assertTrue(elsewhereByNature < (onTheLine + elsewhereByNature) / 20, elsewhereByNature + " shown elsewhere");
    }

    private void judge(String file, Mutation mutation) {
        try {
            Chain chain = ModelReader.read(Source.ofText(file, mutation.text()), Optional.empty(), Overrides.NONE)
                    .chain();
            accepted++;
            judgeAccepted(file, mutation, chain);
        } catch (RefusedException refused) {
            judgeRefused(file, mutation, refused.faults());
        }
    }

    private void judgeAccepted(String file, Mutation mutation, Chain chain) {
        SecondReading.Result second = SecondReading.compare(mutation.text(), chain);
        compared += second.compared();
        if (!second.differences().isEmpty() || !ChainCheck.violations(chain).isEmpty() || !addsUp(chain)) {
            wrong.add(file + ": " + mutation.after() + " was accepted: " + second.differences());
        }
    }

    private static boolean addsUp(Chain chain) {
        List<Rational> ones = chain.states().stream().map(state -> Rational.ONE).toList();
        List<Rational> sums = chain.matrix().columns().stream().map(column -> column.stream()
                .map(entry -> entry.value()).reduce(Rational.ZERO, Rational::plus)).toList();
        return chain.kind() == Chain.Kind.RECURSION || sums.equals(ones);
    }

    private void judgeRefused(String file, Mutation mutation, List<Fault> faults) {
        if (faults.stream().anyMatch(fault -> mutation.touches(fault.position().line()))) {
            onTheLine++;
        } else if (faults.stream().anyMatch(fault -> names(fault, mutation) || isOfItsEntry(fault, mutation)
                || isNextLine(fault, mutation))) {
            elsewhereByNature++;
        } else {
            wrong.add(file + ":" + mutation.first() + ": " + mutation.after() + " was refused with " + faults);
        }
    }

    private static boolean names(Fault fault, Mutation mutation) {
        String touched = mutation.before() + "\n" + mutation.after();
        boolean ofName = Pattern.compile("'([^']+)'").matcher(fault.message()).results()
                .anyMatch(quoted -> touched.contains(quoted.group(1)));
        boolean ofLine = Pattern.compile("line (\\d+)").matcher(fault.message()).results()
                .anyMatch(line -> mutation.touches(Integer.parseInt(line.group(1))));
        return ofName || ofLine || Pattern.compile("probability (\\w+) = ").matcher(fault.message()).results()
                .anyMatch(name -> touched.contains(name.group(1)));
    }

    private static boolean isOfItsEntry(Fault fault, Mutation mutation) {
        int line = fault.position().line();
        return line < mutation.first() && (line == 1 || indentation(mutation, line) < indentation(mutation, mutation.first()));
    }

    private static boolean isNextLine(Fault fault, Mutation mutation) {
        return OF_STRUCTURE.contains(fault.code()) && fault.position().line() == mutation.last() + 1;
    }

    private static int indentation(Mutation mutation, int line) {
        String text = mutation.text().lines().skip(line - 1L).findFirst().orElse("");
        return text.length() - text.stripLeading().length();
    }
}
