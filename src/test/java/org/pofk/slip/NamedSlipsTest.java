package org.pofk.slip;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import java.util.stream.Collectors;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.pofk.claim.Claims;
import org.pofk.input.ClaimsReader;
import org.pofk.input.ModelVariants;
import org.pofk.input.Overrides;
import org.pofk.input.Source;
import org.pofk.text.RefusedException;

/** Which slips are named for a single claim about a published chain, all of them in their order. */
class NamedSlipsTest {
    @ParameterizedTest
    @CsvSource(delimiter = '|', quoteCharacter = '`', textBlock = """
            cycle-5             | {long run: all, are: {'0': '0.200', '1': '0.200', '2': '0.200', '3': '0.200', '4': '0.239'}} | NOT_SUMMING_TO_ONE, WRONG_COEFFICIENT
            availability-two-state | {matrix: all, are: [['999/1000', '1/1000'], ['1/10', '9/10']]}   | MATRIX_TRANSPOSED
            availability-two-state | {matrix: all, are: [['999/1000', '2/10'], ['1/1000', '9/10']]}   | NOT_SUMMING_TO_ONE, WRONG_COEFFICIENT
            cube-walk           | {start: all, are: {'0': '0', '1': '0', '2': '0', '3': '1'}}         | START_MISREAD
            reflecting-walk-5   | {long run: 'at4', are: ['0', '0.250000']}                           | INDEX_SHIFTED, START_MISREAD
            chebyshev-T         | {pair: 'y(k+1)', radius: '1', angle: '0.92730', amplitude: '1', phase: '-0.92730'} | SIGN_OF_THE_PHASE
            chebyshev-T         | {pair: 'y', radius: '1', angle: '53.130102 deg', amplitude: '0.50000000', phase: '0'} | PAIR_NOT_DOUBLED
            chebyshev-T         | {formula: 'y(k)', is: '(1/2)*((3/5) - (4/5*sqrt(1))*i)^k'}          | TERM_MISSING
            chebyshev-T         | {formula: 'y', is: '(0.5)*(0.6 + 0.8*i)^k'}                         | TERM_MISSING
            gaussian-one-plus-i | {formula: 'y(k+1)', is: '(0.500000 - 0.500000*i)*(1 + 1.000000*i)^k'} | TERM_MISSING
            gaussian-one-plus-i | {formula: 'y(k+1)', is: '2*1.41421^(k-1)*cos(0.0785398*(k-1))'}     | DECIMAL_POINT_MOVED
            rearrange-front-3   | {formula: 'identity', is: '0.33333*delta(k) - 0.50000*0.38533^k + 0.16667'} | SIGN_OF_A_TERM, WRONG_POLE
            reflecting-walk-5   | {transform: 'at4', is: '(0.15200)/((z - 1)*(z + 1)*(z - 0.70711)*(z + 0.70711))'} | DIGITS_TRANSPOSED
            reflecting-walk-5   | {transform: 'at4', is: '(0.1200)/((z - 1)*(z + 1)*(z - 0.7071)*(z + 0.7071))'} | ROUNDED_TOO_EARLY
            cycle-5             | {formula: '0', is: '0.2000000000 + 0.04000000000*0.3090169944^k + 0.4000000000*(-0.8090169944)^k'} | DECIMAL_POINT_MOVED
            bernardelli-waves   | {transform: 'age0', is: '33.333333*z/(z - 1)'}                      | TERM_MISSING
            inventory-policy    | {transform over z: '0', is: '-0.2640/z + 0.2857/(z - 1)'}           | TERM_MISSING
            """)
    void theSlipsOfOneClaimAreNamed(String model, String claim, String kinds) throws RefusedException {
        Finding finding = finding("test-data/published", model, "columns", claim);
        List<SlipKind> named = finding.slips().stream().map(Slip::kind).toList();
        assertEquals(kinds, named.stream().map(SlipKind::name).collect(Collectors.joining(", ")), finding::toString);
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', quoteCharacter = '`', textBlock = """
            sluice-actuator | rows    | {matrix: all, are: [[0.95, 0.05, 0], [0, 0.5, 0.5], [0.8, 0, 0.2]]} | RATE_AS_PROBABILITY
            compressor-pair | rows    | {matrix: all, are: [[0.82, 0.18, 0], [0.45, 0.5, 0.05], [0.25, 0.5, 0.25]]} | TWO_EVENT_MOVE_FORGOTTEN
            mixer-seal      | columns | {matrix: all, are: [[3/4, 0, 0, 1/4], [1/4, 3/4, 0, 0], [0, 1/4, 3/4, 0], [0, 0, 1/4, 3/4]]} | ABSORBING_STATE_LEFT
            relay-link      | rows    | {matrix: all, are: [[0.3, 0.7], [0.8, 0.3]]}                        | NOT_SUMMING_TO_ONE
            ../models/pump-pair | columns | {long run: all, are: {both: 1, one: 0.1625, none: 0.009583}}    | EIGENVECTOR_NOT_SCALED
            """)
    void aMisreadChainIsNamedFirst(String model, String convention, String claim, SlipKind kind)
            throws RefusedException {
        Finding finding = finding("test-data/claims", model, convention, claim);
        assertEquals(kind, finding.slips().get(0).kind(), finding::toString);
    }

    private static Finding finding(String folder, String model, String convention, String claim)
            throws RefusedException {
        String text = "pofk-claims: 1\nmodel: " + model + ".yaml\nreview: {carried: 4 significant, convention: " + convention
                + "}\nclaims:\n  - " + claim + "\n";
        Claims claims = ClaimsReader.read(Source.ofText("claims.yaml", text), Optional.of(Path.of(folder)),
                Overrides.NONE);
        return Reviewing.of(claims, ModelVariants.of(claims, Overrides.NONE)).findings().get(0);
    }
}
