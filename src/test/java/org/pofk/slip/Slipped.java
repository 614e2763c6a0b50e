package org.pofk.slip;

import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import org.pofk.claim.Claims;
import org.pofk.input.ClaimsReader;
import org.pofk.input.Overrides;
import org.pofk.input.Source;
import org.pofk.text.RefusedException;

/**
 * A claim with one slip in it.
 *
 * @param model     a pattern
 * @param claim     the claim as a line of YAML, with {@code …} where its formula stands
 * @param wrong     the formula with the slip
 * @param right     the formula without it
 * @param found     what stands where the slip is
 * @param instead   what should stand there
 */
record Slipped(String model, String claim, String wrong, String right, SlipKind kind, String found, String instead) {
    private static final String LOST = "{formula: lost, is: '…'}";
    private static final String DECK = "{formula: good deck, is: '…'}";
    private static final String LEVEL = "{formula: deviation, is: '…'}";
    private static final String LEVEL_RIGHT = "1.0583*0.8^k*cos(1.0472*k + 0.33347)";
    private static final String LEVEL_DEGREES = "1.0583*0.8^k*cos(60 deg*k + 19.107 deg)";
    private static final String LOST_RIGHT = "0.008176 - 0.01726*0.4508^k + 0.009084*0.2317^k";
    private static final String LOST_Z = "{transform: lost, is: '…'}";
    private static final String LINK = "{formula: frame lost, is: '…'}";
    private static final String LINK_RIGHT = "11/360 - 133/4500*(73/100)^k";

    /** Claims about a pattern, one a line of YAML. */
    static Claims claims(String model, String... lines) {
        String text = "pofk-claims: 1\nmodel: " + model + ".yaml\nclaims:\n  - " + String.join("\n  - ", lines) + "\n";
        try {
            return ClaimsReader.read(Source.ofText("claims.yaml", text), Optional.of(Path.of("test-data/models")),
                    Overrides.NONE);
        } catch (RefusedException refused) {
            throw new AssertionError(refused.faults().toString(), refused);
        }
    }

    Claims claims() {
        return claims(model, claim.replace("…", wrong));
    }

    Claims rightClaims() {
        return claims(model, claim.replace("…", right));
    }

    @Override
    public String toString() {
        return kind + ": " + wrong;
    }

    private static Slipped lost(SlipKind kind, String wrong, String found, String instead) {
        return new Slipped("pump-pair", LOST, wrong, LOST_RIGHT, kind, found, instead);
    }

    private static Slipped level(SlipKind kind, String wrong, String right, String found, String instead) {
        return new Slipped("level-controller", LEVEL, wrong, right, kind, found, instead);
    }

    private static Slipped link(SlipKind kind, String wrong, String found, String instead) {
        return new Slipped("burst-error-link", LINK, wrong, LINK_RIGHT, kind, found, instead);
    }

    /** Slips in formulas in k. */
    static List<Slipped> formulas() {
        return List.of(
                lost(SlipKind.SIGN_OF_A_TERM, "0.008176 - 0.01726*0.4508^k - 0.009084*0.2317^k",
                        "-0.009084*0.2317^k", "+0.009084*0.2317^k"),
                lost(SlipKind.SIGN_OF_A_TERM, "0.008176 + 0.01726*0.4508^k + 0.009084*0.2317^k",
                        "+0.01726*0.4508^k", "-0.01726*0.4508^k"),
                lost(SlipKind.SIGN_OF_A_TERM, "-0.008176 - 0.01726*0.4508^k + 0.009084*0.2317^k",
                        "-0.008176", "0.008176"),
                link(SlipKind.SIGN_OF_A_TERM, "11/360 + 133/4500*(73/100)^k", "+133/4500*(73/100)^k",
                        "-133/4500*(73/100)^k"),
                lost(SlipKind.COEFFICIENTS_SWAPPED, "0.008176 - 0.009084*0.4508^k + 0.01726*0.2317^k",
                        "0.009084 and 0.01726", "0.01726 and 0.009084"),
                lost(SlipKind.COEFFICIENTS_SWAPPED, "0.008176 + 0.009084*0.4508^k - 0.01726*0.2317^k",
                        "0.009084 and 0.01726", "0.01726 and 0.009084"),
                lost(SlipKind.TERM_MISSING, "0.008176 - 0.01726*0.4508^k", "", "+ 0.009084*0.2317^k"),
                lost(SlipKind.DIGITS_TRANSPOSED, "0.008176 - 0.01726*0.4580^k + 0.009084*0.2317^k", "0.4580",
                        "0.4508"),
                lost(SlipKind.DIGITS_TRANSPOSED, "0.008176 - 0.01762*0.4508^k + 0.009084*0.2317^k", "0.01762",
                        "0.01726"),
                lost(SlipKind.DECIMAL_POINT_MOVED, "0.008176 - 0.1726*0.4508^k + 0.009084*0.2317^k", "0.1726",
                        "0.01726"),
                lost(SlipKind.ROUNDED_TOO_EARLY, "0.008176 - 0.01726*0.4500^k + 0.009084*0.2317^k", "0.4500",
                        "0.4508"),
                lost(SlipKind.WRONG_POLE, "0.008176 - 0.01726*0.4917^k + 0.009084*0.2317^k", "0.4917", "0.4508"),
                lost(SlipKind.WRONG_COEFFICIENT, "0.008176 - 0.01914*0.4508^k + 0.009084*0.2317^k", "0.01914",
                        "0.01726"),
                link(SlipKind.WRONG_COEFFICIENT, "11/360 - 131/4500*(73/100)^k", "131", "133"),
                lost(SlipKind.INDEX_SHIFTED, "0.008176 - 0.01726*0.4508^(k+1) + 0.009084*0.2317^(k+1)",
                        "0.008176 - 0.01726*0.4508^(k+1) + 0.009084*0.2317^(k+1)", LOST_RIGHT),
                link(SlipKind.INDEX_SHIFTED, "11/360 - 133/4500*(73/100)^(k-1)", "11/360 - 133/4500*(73/100)^(k-1)",
                        LINK_RIGHT),
                new Slipped("deck-condition", DECK, "-3*(9/10)^k + 3/10*k*(9/10)^k + 4*(17/20)^k",
                        "-3*(9/10)^k + 3/10*k*(9/10)^(k-1) + 4*(17/20)^k", SlipKind.POWER_NOT_LOWERED,
                        "(9/10)^k", "(9/10)^(k-1)"),
                new Slipped("deck-condition", DECK, "-3*0.9^k + 0.3*0.9^k + 4*0.85^k",
                        "-3*0.9^k + k*0.3*0.9^(k-1) + 4*0.85^k", SlipKind.REPEATED_POLE_AS_SIMPLE, "0.3*0.9^k",
                        "k*0.3*0.9^(k-1)"),
                new Slipped("burner-start", "{formula: not yet fired, is: '…'}", "delta(k-1) + delta(k-2)",
                        "delta(k-1) + delta(k-2) + delta(k)", SlipKind.IMPULSE_MISSING, "", "+ delta(k)"),
                level(SlipKind.PAIR_NOT_DOUBLED, "0.52915*0.8^k*cos(1.0472*k + 0.33347)",
                        "1.05830*0.8^k*cos(1.0472*k + 0.33347)", "0.52915", "1.05830"),
                level(SlipKind.PAIR_DOUBLED_TWICE, "2.1166*0.8^k*cos(1.0472*k + 0.33347)", LEVEL_RIGHT, "2.1166",
                        "1.0583"),
                level(SlipKind.SIGN_OF_THE_PHASE, "1.0583*0.8^k*cos(1.0472*k - 0.33347)", LEVEL_RIGHT, "-0.33347",
                        "+0.33347"),
                level(SlipKind.SINE_FOR_COSINE, "1.0583*0.8^k*sin(1.0472*k + 0.33347)", LEVEL_RIGHT,
                        "sin(1.0472*k + 0.33347)", "cos(1.0472*k + 0.33347)"),
                level(SlipKind.DEGREES_AS_RADIANS, "1.0583*0.8^k*cos(60*k + 19.107)", LEVEL_DEGREES,
                        "cos(60*k + 19.107)", "cos(60 deg*k + 19.107 deg)"),
                level(SlipKind.RADIANS_AS_DEGREES, "1.0583*0.8^k*cos(1.0472 deg*k + 0.33347 deg)", LEVEL_RIGHT,
                        "cos(1.0472 deg*k + 0.33347 deg)", "cos(1.0472*k + 0.33347)"));
    }

    /** Slips in transforms. */
    static List<Slipped> transforms() {
        return List.of(
                new Slipped("pump-pair", LOST_Z, "(0.0025 z + 0.00095)/((z-1)*(z-0.2317)*(z-0.4508))",
                        "z*(0.0025 z + 0.00095)/((z-1)*(z-0.2317)*(z-0.4508))", SlipKind.Z_LOST,
                        "(0.0025 z + 0.00095)/((z-1)*(z-0.2317)*(z-0.4508))",
                        "z*(0.0025 z + 0.00095)/((z-1)*(z-0.2317)*(z-0.4508))"),
                new Slipped("pump-pair", LOST_Z, "z^2*(0.0025 z + 0.00095)/((z-1)*(z-0.2317)*(z-0.4508))",
                        "z*(0.0025 z + 0.00095)/((z-1)*(z-0.2317)*(z-0.4508))", SlipKind.Z_DOUBLED, "z^2", "z"),
                new Slipped("pump-pair", LOST_Z, "z*(0.0025 z - 0.00095)/((z-1)*(z-0.2317)*(z-0.4508))",
                        "z*(0.0025 z + 0.00095)/((z-1)*(z-0.2317)*(z-0.4508))", SlipKind.SIGN_OF_A_TERM, "-0.00095",
                        "+0.00095"),
                new Slipped("pump-pair", LOST_Z, "z*(0.0025 z + 0.00095)/((z-1)*(z-0.2371)*(z-0.4508))",
                        "z*(0.0025 z + 0.00095)/((z-1)*(z-0.2317)*(z-0.4508))", SlipKind.DIGITS_TRANSPOSED, "0.2371",
                        "0.2317"));
    }

    /** Slips in lists and single numbers. */
    static List<Slipped> lists() {
        return List.of(
                new Slipped("pump-pair", "{poles: lost, are: [1, 0.2317, …]}", "0.4580", "0.4508",
                        SlipKind.DIGITS_TRANSPOSED, "0.4580", "0.4508"),
                new Slipped("pump-pair", "{value: lost, at: 5, is: …}", "0.07861", "0.007861",
                        SlipKind.DECIMAL_POINT_MOVED, "0.07861", "0.007861"),
                new Slipped("pump-pair", "{long run: lost, is: …}", "0.991824", "0.008176",
                        SlipKind.COMPLEMENT_QUOTED, "0.991824", "0.008176"));
    }
}
