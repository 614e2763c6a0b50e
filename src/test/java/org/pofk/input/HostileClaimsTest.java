package org.pofk.input;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import java.util.stream.Collectors;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.pofk.claim.Claims;
import org.pofk.exact.Rational;
import org.pofk.slip.Variants;
import org.pofk.text.RefusedException;

/** Claims that would take for ever are refused, one fault each; many claims are read. */
class HostileClaimsTest {
    private static Claims read(String model, String claims) throws RefusedException {
        return ClaimsReader.read(Source.ofText("c", "pofk-claims: 1\nmodel: " + model + "\nclaims:\n" + claims),
                Optional.of(Path.of("test-data/models")), Overrides.NONE);
    }

    @ParameterizedTest
    @ValueSource(strings = {"2^99999999", "0.5^(10^9)", "(0.1234567891234^99999)^99999", "binomial(k, 99999)",
        "(0.1 + k)^5000", "(0.2^k + 0.3^k + 0.4^k)^300", "exp(exp(100))", "delta(k - 999999999999)"})
    void aFormulaThatCantBeWorkedOut(String formula) {
        RefusedException refused = assertThrows(RefusedException.class,
                () -> read("pump-pair.yaml", "  - {formula: lost, is: '" + formula + "'}\n"));
        assertEquals(1, refused.faults().size(), refused.getMessage());
        assertEquals(4, refused.faults().get(0).position().line());
    }

    @Test
    void anUnknownNameInEveryOneOfManyClaims() {
        String claims = IntStream.range(0, 1_000).mapToObj(i -> "  - {value: lots" + i + ", at: x, is: 0.1}\n")
                .collect(Collectors.joining());
        assertEquals(2_000, assertThrows(RefusedException.class, () -> read("pump-pair.yaml", claims)).faults().size());
    }

    @Test
    void aHundredThousandLevels() {
        RefusedException refused = assertThrows(RefusedException.class,
                () -> read("pump-pair.yaml", "  - {formula: lost, is: " + "[".repeat(100_000)));
        assertEquals(List.of("too-deep"), refused.faults().stream().map(fault -> fault.code()).toList());
    }

    @Test
    void anotherValueOfAParameterMakesAnotherChainOrNone() throws RefusedException {
        Claims claims = read("burst-error-link.yaml", "");
        Variants variants = ModelVariants.of(claims, Overrides.NONE);
        String parameter = claims.model().parameters().get(0).name();
        Rational value = Rational.of(1, 7);
        assertEquals(false, variants.with(parameter, value).orElseThrow().equals(claims.model().chain()));
        assertEquals(Optional.empty(), variants.with(parameter, Rational.of(7)));
        assertEquals(Optional.empty(), variants.with("nothing of that name", value));
        assertEquals(Variants.NONE, ModelVariants.of(read("pump-pair.yaml", ""), Overrides.NONE));
    }
}
