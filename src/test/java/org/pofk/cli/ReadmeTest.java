package org.pofk.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.regex.MatchResult;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.pofk.chain.Model;
import org.pofk.input.ModelReader;
import org.pofk.input.Overrides;
import org.pofk.input.Source;

/** What the README shows is what the program prints. */
class ReadmeTest {
    private static final Pattern CONSOLE = Pattern.compile("(?s)```console\\n(.*?)```");
    private static final Pattern FIRST_PAGE = Pattern.compile("(?s)```first-page\\n\\$ (.*?)\\n(.*?)```");
    private static final Pattern COMMAND = Pattern.compile("(?m)^\\$ (.*)$");
    private static final Pattern BY_MAVEN = Pattern.compile("mvn -q -B compile exec:java -Dexec.args=\"(.*)\"");
    private static final Pattern MODEL = Pattern.compile("(?s)```yaml\\n(pofk: .*?)```");
    private static final Pattern CLAIMS = Pattern.compile("(?s)```yaml\\n(pofk-claims: .*?)```");

    /** A command line of the README and what is shown below it. */
    record Example(String command, String shown) {
        List<String> arguments() {
            Matcher byMaven = BY_MAVEN.matcher(command);
            String arguments = byMaven.matches() ? byMaven.group(1) : command.replaceFirst("^pofk ", "");
            return Arrays.asList(arguments.split(" "));
        }
    }

    static List<Example> examples() throws IOException {
        List<Example> examples = new ArrayList<>();
        for (String block : blocks(CONSOLE)) {
            List<MatchResult> commands = COMMAND.matcher(block).results().toList();
            for (int i = 0; i < commands.size(); i++) {
                int end = i + 1 < commands.size() ? commands.get(i + 1).start() : block.length();
                examples.add(new Example(commands.get(i).group(1), block.substring(commands.get(i).end() + 1, end)));
            }
        }
        return examples;
    }

    @ParameterizedTest
    @MethodSource("examples")
    void anExamplePrintsWhatIsShown(Example example) {
        Run run = Run.of(example.arguments());
        assertEquals(example.shown(), run.answer() + run.notes());
    }

    @Test
    void theFirstPageShownIsThatOfTheReport() throws IOException {
        List<MatchResult> pages = FIRST_PAGE.matcher(Files.readString(Path.of("README.md"))).results().toList();
        assertEquals(1, pages.size());
        Run run = Run.of(new Example(pages.get(0).group(1), "").arguments());
        assertEquals(0, run.exitCode(), run.notes());
        assertTrue(run.answer().startsWith(pages.get(0).group(2)), run.answer());
    }

    @Test
    void everyBuiltCommandThatReadsAModelHasAnExample() throws IOException {
        List<String> commands = examples().stream().map(example -> example.arguments().get(0)).toList();
        assertTrue(commands.containsAll(List.of("derive", "inspect", "simulate", "check", "help")), commands.toString());
        assertTrue(examples().get(0).command().startsWith("mvn "));
    }

    @Test
    void theModelShownIsThePatternItSaysItIs() throws Exception {
        List<String> models = blocks(MODEL);
        assertEquals(1, models.size());
        Model shown = ModelReader.read(Source.ofText("README.md", models.get(0)), Optional.empty(), Overrides.NONE);
        Model pattern = ModelReader.read(Path.of("test-data/models/pump-pair.yaml"), Overrides.NONE);
        assertEquals(pattern.chain(), shown.chain());
        assertEquals(pattern.title(), shown.title());
    }

    @Test
    void theClaimsShownAreThoseThatAreChecked() throws IOException {
        assertEquals(List.of(Files.readString(Path.of("test-data/claims/pump-pair.yaml"))), blocks(CLAIMS));
    }

    private static List<String> blocks(Pattern pattern) throws IOException {
        return pattern.matcher(Files.readString(Path.of("README.md"))).results().map(block -> block.group(1)).toList();
    }
}
