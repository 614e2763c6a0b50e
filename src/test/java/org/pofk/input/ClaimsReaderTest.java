package org.pofk.input;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import java.util.OptionalLong;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.pofk.chain.Model.Convention;
import org.pofk.claim.Claim;
import org.pofk.claim.Claim.SafeSide;
import org.pofk.claim.Claim.Steps;
import org.pofk.claim.Claims;
import org.pofk.claim.FormulaText;
import org.pofk.claim.Statement;
import org.pofk.exact.Rational;
import org.pofk.formula.ParsedFormula;
import org.pofk.meaning.Carried;
import org.pofk.text.RefusedException;

class ClaimsReaderTest {
    private static final String HEAD = "pofk-claims: 1\nmodel: pump-pair.yaml\n";

    private static Claims read(String text) throws RefusedException {
        return ClaimsReader.read(Source.ofText("claims.yaml", HEAD + text), Optional.of(Path.of("test-data/models")),
                Overrides.NONE);
    }

    private static Claim one(String claim) throws RefusedException {
        Claims claims = read("claims:\n  - " + claim + "\n");
        assertEquals(1, claims.claims().size());
        return claims.claims().get(0);
    }

    private static String refused(String claim) {
        return assertThrows(RefusedException.class, () -> one(claim), claim).getMessage();
    }

    private static String texts(Statement statement) {
        return statement instanceof Statement.Matrix matrix
                ? matrix.rows().stream().map(row -> row.stream().map(FormulaText::text).toList()).toList().toString()
                : statement instanceof Statement.Poles poles ? poles.poles().stream()
                .map(pole -> pole.value().text() + "*" + pole.multiplicity()).toList().toString()
                : ((Statement.Start) statement).components().stream().map(each -> each.is().text()).toList().toString();
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', quoteCharacter = '"', value = {
        "{matrix: all, is-latex: '\\begin{pmatrix} 0.9 & 0{,}6 & 0 \\\\ 0.1 & \\frac{2}{5} & 0 \\\\ 0 & 0 & 1 \\end{pmatrix}'} "
                + "| [[0.9, 0{,}6, 0], [0.1, \\frac{2}{5}, 0], [0, 0, 1]]",
        "{matrix: all, is-latex: '\\begin{bmatrix}1&0&0\\\\0&1&0\\\\0&0&1\\\\\\end{bmatrix}'} "
                + "| [[1, 0, 0], [0, 1, 0], [0, 0, 1]]",
        "{start: all, is-latex: '\\begin{pmatrix} 1 \\\\ 0 \\\\ 0 \\end{pmatrix}'} | [1, 0, 0]",
        "{start: all, is-latex: '1, 0, 0'} | [1, 0, 0]",
        "{poles: lost, is-latex: '1, 0{,}2317, 0{,}4508 (twice), 0.4 \\pm 0.33\\,i'} "
                + "| [1*1, 0{,}2317*1, 0{,}4508*2, 0.4 +   0.33\\,i*1, 0.4 -   0.33\\,i*1]",
        "{poles: lost, is-latex: '1,0.2317;0.4508'} | [1*1, 0.2317*1, 0.4508*1]",
        "{poles: lost, is-latex: '\\left\\{1, (0.5 - 0.1)\\right\\}'} | [1*1, (0.5 - 0.1)*1]",
        "{poles: lost, is: '1, 0.2317, 0.4508 (twice)'} | [1*1, 0.2317*1, 0.4508*2]",
        "{poles: lost, is-latex: '(1), (0.5)'} | [(1)*1, (0.5)*1]",
        "{poles: lost, is-latex: '(1 - 0.5)'} | [(1 - 0.5)*1]",
        "{start: all, is-latex: '(1, 0, 0)^{\\mathrm{T}}'} | [1, 0, 0]",
        "{start: all, is-latex: 'x_0 = \\left(\\begin{array}{c} 1 \\\\ 0 \\\\ 0 \\end{array}\\right)'} | [1, 0, 0]",
        "{start: all, is-latex: '\\begin{pmatrix} 1 & 0 & 0 \\end{pmatrix}^\\top'} | [1, 0, 0]",
        "{poles: lost, is-latex: '\\frac{1}{2}'} | [\\frac{1}{2}*1]"
    })
    void matricesVectorsAndListsOfPolesAreReadFromOneText(String claim, String texts) throws RefusedException {
        Claim read = read("review: {convention: columns}\nclaims:\n  - " + claim + "\n").claims().get(0);
        assertEquals(texts, texts(read.statement()));
    }

    @Test
    void aMatrixInLatexThatIsNoneIsToldItsForm() {
        assertTrue(refused("{matrix: all, is-latex: '1, 0, 0'}").contains("\\begin{pmatrix} 0.9 & 0.2"));
        assertTrue(refused("{matrix: all, is-latex: '\\begin{pmatrix} 1 & 0 \\\\ 0 & 1 \\end{pmatrix}'}")
                .contains("the matrix has 2 rows of 2, but the model has 3 states"));
    }

    @Test
    void everyKindIsRead() throws RefusedException {
        Claims claims = read("""
                review: {document: PN-12, revision: B, author: R. Vale, convention: columns, carried: 4 significant}
                claims:
                  - {start: all, are: {both: 1}}
                  - {matrix: all, are: [[0.9025, 3/5, 0], [0.095, 0.38, 3/5], [1/400, 0.02, 0.4]]}
                  - {characteristic polynomial: all, is: '(λ-1)*(λ-0.2317)*(λ-0.4508)'}
                  - {minimal polynomial: all, is: '(x-1)*(x-0.2317)*(x-0.4508)'}
                  - {transform: lost, is: 'z*(0.0025 z + 0.00095)/((z-1)*(z-0.2317)*(z-0.4508))', where: "eq. (3)"}
                  - {transform over z: lost, is: '0.008176/(z-1)'}
                  - {expansion: lost, is: '0.008176*z/(z-1)'}
                  - {poles: lost, are: [1, 0.2317, 0.4508 (twice), 0.4 ± 0.33 i]}
                  - {residues: lost, are: {1: 0.008176, 0.4508: [-0.01726, 0.1]}}
                  - {formula: lost, is: '0.008176 - 0.01726*0.4508^k + 0.009084*0.2317^k', for: k >= 1}
                  - {formula: all, are: {both: '0.85', one: '0.1*0.45^k'}}
                  - {pair: lost, radius: 0.52, angle: 39.7 deg, amplitude: 0.66, phase: -119 deg}
                  - {long run: all, are: {both: 0.8532, one: 0.1386, none: 0.008176}}
                  - {long run: lost, is: none}
                  - {long run: lost, are: [0.1, 0.2]}
                  - {eigenvector: all, at: 1, are: [0.8532, 0.1386, 0.008176]}
                  - {value: lost, at: 5, is: 0.008, within: 2%, safe side: above, note: as in the table}
                  - {bound: lost, at most: 0.01, for: k >= 0, carried: 4 decimals}
                  - {settling step: lost, within: 0.001, is: 9}
                  - {mean passage: all, into: none, from: both, is: 207.2}
                  - {sum: lost, to: 10, is: 0.0638}
                  - {mean: lost, from: 1, to: 10, is: 0.00638}
                """);
        assertEquals(ClaimKind.values().length, claims.claims().stream().map(Claim::kind).distinct().count());
        assertEquals("PN-12 B R. Vale", claims.review().document().get() + " " + claims.review().revision().get() + " "
                + claims.review().author().get());
        assertEquals(Optional.of(Convention.COLUMNS), claims.review().convention());
        assertEquals("eq. (3)", claims.claims().get(4).where().orElseThrow());
        assertEquals(new Carried(4, Carried.Unit.SIGNIFICANT), claims.claims().get(0).carried().orElseThrow());
        assertEquals(new Carried(4, Carried.Unit.DECIMALS), claims.claims().get(17).carried().orElseThrow());
        Claim value = claims.claims().get(16);
        assertEquals(new Claim.Within(Rational.of(1, 50), true), value.within().orElseThrow());
        assertEquals(SafeSide.ABOVE, value.safeSide().orElseThrow());
        assertEquals("as in the table", value.note().orElseThrow());
        assertEquals("Brine pump pair (invented)", claims.model().title());
    }

    @Test
    void bothSignsAreTwoPolesWithTheSameDigitsAtTheSamePlace() throws RefusedException {
        for (String sign : List.of("±", "+-", "+/-")) {
            Statement.Poles poles = (Statement.Poles) one("{poles: lost, are: [0.4 " + sign + " 0.33 i (3 times)]}")
                    .statement();
            assertEquals(List.of(3, 3), poles.poles().stream().map(Statement.Poles.Pole::multiplicity).toList());
            List<List<ParsedFormula>> digits = poles.poles().stream().map(pole -> pole.value().parsed().nodes()
                    .filter(node -> node.parts().isEmpty()).toList()).toList();
            assertEquals(digits.get(0), digits.get(1));
            assertEquals("claims.yaml:4:25", digits.get(0).get(0).position().toString());
            assertEquals(30 + sign.length(), digits.get(0).get(1).position().column());
        }
    }

    @ParameterizedTest
    @CsvSource({"k >= 1,1,", "k > 0,1,", "k ≥ 2,2,", "k = 1..20,1,20", "k = 3,3,3", "1 <= k < 20,1,19", "k <= 7,0,7",
        "all k,0,"})
    void stepsAreReadAsWritten(String text, long from, Long to) throws RefusedException {
        assertEquals(new Steps(from, to == null ? OptionalLong.empty() : OptionalLong.of(to)),
                one("{bound: lost, at most: 0.01, for: '" + text + "'}").steps());
    }

    @Test
    void aFormulaInABlockOrOnSeveralLinesKeepsItsPlaces() throws RefusedException {
        for (String block : List.of("is: |\n        0.1 +\n          0.2*0.5^k\n",
                "is: >-\n        0.1 +\n          0.2*0.5^k\n", "is: 0.1 +\n          0.2*0.5^k\n",
                "is: '0.1 +\n          0.2*0.5^k'\n")) {
            Statement.PofK formula = (Statement.PofK) one("formula: lost\n    " + block).statement();
            ParsedFormula k = formula.parts().get(0).is().parsed().symbols().get(0);
            assertEquals(19, k.position().column(), block);
            assertEquals(block.startsWith("is: 0") || block.startsWith("is: '") ? 6 : 7, k.position().line(), block);
        }
    }

    @Test
    void latexIsReadToTheSameTreeAsOrdinaryNotation() throws RefusedException {
        Statement.PofK plain = (Statement.PofK) one("{formula: lost, is: 'lost(k) = 1/2 - 0.5*0.45^k*cos(0.3*k)'}")
                .statement();
        Statement.PofK latex = (Statement.PofK) one(
                "{formula: lost, is-latex: 'p(k) = \\frac{1}{2} - 0.5\\cdot 0.45^{k}\\cos(0.3k)'}").statement();
        assertEquals(plain.parts().get(0).is().parsed().formula(), latex.parts().get(0).is().parsed().formula());
        Statement.Poles poles = (Statement.Poles) one("{poles: lost, is-latex: ['1', '0.4 \\pm 0.33 j (twice)']}")
                .statement();
        assertEquals(List.of(1, 2, 2), poles.poles().stream().map(Statement.Poles.Pole::multiplicity).toList());
    }

    @Test
    void aBackslashInsideDoubleQuotesIsRefused() {
        String refused = refused("{formula: lost, is-latex: \"\\frac{1}{2}\"}");
        assertEquals("claims.yaml:4:31: inside double quotes YAML changes what a backslash begins; use single quotes",
                refused);
    }

    @Test
    void faultsOfTheModelAreToldWithThoseOfTheClaims() {
        RefusedException refused = assertThrows(RefusedException.class, () -> ClaimsReader.read(
                Source.ofText("claims.yaml", "pofk-claims: 1\nmodel: negative.yaml\nclaims: [{sum: lost, to: 3}]\n"),
                Optional.of(Path.of("test-data/refused")), Overrides.NONE));
        assertEquals(List.of("claims.yaml", "test-data/refused/negative.yaml"),
                refused.faults().stream().map(fault -> fault.position().source()).distinct().toList());
        assertTrue(refused.getMessage().contains("nothing is stated here"));
    }

    @Test
    void aFileWithoutClaimsIsReadAllTheSame() throws RefusedException {
        assertEquals(List.of(), read("claims:\n").claims());
        assertEquals(List.of(), read("claims: []\n").claims());
        assertEquals(List.of(), read("").claims());
    }
}
