package twofold.material;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import twofold.Checks;
import twofold.Checks.Check;

/** Indices against printed values and against other evaluations of the same published coefficients. */
class MaterialReferenceTest {

    private static final double MICROMETRE = 1e-6;

    // Sodium d, hydrogen F and C lines, µm, as the definition of the Abbe number V_d uses them.
    private static final double LINE_D = 0.5875618;
    private static final double LINE_F = 0.4861327;
    private static final double LINE_C = 0.6562725;

    /** The coefficients were copied and combined as published: the same sets evaluated elsewhere with 40 digits. */
    @ParameterizedTest
    @ValueSource(
            strings = {
                "n.exact.fused_silica", // Malitson, J. Opt. Soc. Am. 55, 1205 (1965)
                "n.exact.sapphire_o", // Malitson & Dodge 1972
                "n.exact.sapphire_e", // Malitson & Dodge 1972
                "n.exact.bk7", // public datasheet
                "n.exact.caf2", // Malitson, Appl. Opt. 2, 1103 (1963)
                "n.exact.yag", // Zelmon, Small & Page, Appl. Opt. 37, 4933 (1998)
                "n.exact.yvo4_o_b", // set in common use by suppliers
                "n.exact.yvo4_e_b", // set in common use by suppliers
                "n.exact.lbo_x", // Kato, IEEE J. Quantum Electron. 30, 2950 (1994)
                "n.exact.lbo_y", // Kato 1994
                "n.exact.lbo_z", // Kato 1994
                "n.exact.bbo_o_eim", // Eimerl and others, J. Appl. Phys. 62, 1968 (1987)
                "n.exact.bbo_e_eim", // Eimerl and others 1987
                "n.exact.ktp_x", // Kato & Takaoka, Appl. Opt. 41, 5040 (2002)
                "n.exact.ktp_y", // Kato & Takaoka 2002
                "n.exact.ktp_z", // Kato & Takaoka 2002
            })
    void coefficientsAreThePublishedOnes(String id) {
        holds(id);
    }

    /** Printed indices, from sources other than the fits. */
    @ParameterizedTest
    @ValueSource(
            strings = {
                "n.fused_silica.printed", // public page quoting Malitson 1965
                "n.sapphire_o.table", // public sapphire index table
                "n.sapphire_e.table", // public sapphire index table
                "n.bk7.nd", // public glass datasheet
                "n.caf2.cross", // Daimon & Masumura, Appl. Opt. 41, 5275 (2002), an independent measurement at 20 °C
                "n.yag.bond", // Bond, J. Appl. Phys. 36, 1674 (1965): the papers differ by 0.003, hence the tolerance
                "n.lbo_x.table", // Dmitriev, Gurzadyan & Nikogosyan, Handbook of Nonlinear Optical Crystals
                "n.lbo_y.table", // same
                "n.lbo_z.table", // same
                "n.bbo_o.table", // same
                "n.bbo_e.table", // same
                "n.yvo4_o.table", // public encyclopaedia table
                "n.yvo4_e.table", // public encyclopaedia table
            })
    void printedIndicesComeOut(String id) {
        holds(id);
    }

    /** V_d = (n_d − 1)/(n_F − n_C) of a public glass datasheet. */
    @Test
    void theAbbeNumberOfCrownComesOut() {
        Check check = Checks.of("n.abbe");
        String glass = check.name("material");
        check.holds("Vd", List.of((index(glass, LINE_D) - 1) / (index(glass, LINE_F) - index(glass, LINE_C))));
    }

    /**
     * Type I phase matching of LBO in its xy plane, k at φ from x: the fundamental sees n_z, the harmonic the ellipse of
     * n_x and n_y. A check of index differences between axes and wavelengths. Handbook of Nonlinear Optical Crystals, as
     * quoted.
     */
    @Test
    void lithiumTriborateMatchesPhasesAtThePrintedAngle() {
        Check check = Checks.of("pm.lbo.xy");
        double fundamental = check.in("lambda_um");
        double wanted = 1 / square(index("LBO z", fundamental));
        double x = 1 / square(index("LBO x", fundamental / 2));
        double y = 1 / square(index("LBO y", fundamental / 2));
        // 1/n² = sin²φ/n_x² + cos²φ/n_y²
        check.holds("phi_deg", Math.toDegrees(Math.asin(Math.sqrt((wanted - y) / (x - y)))));
    }

    /** Why the index choice matters: Brewster's angle of titanium sapphire in both axes. Fits above, closed form. */
    @Test
    void theBrewsterAngleOfSapphireDependsOnTheAxis() {
        Check check = Checks.of("n.brewster.tisa");
        double ordinary = index("sapphire o", check.in("lambda_um"));
        double extraordinary = index("sapphire e", check.in("lambda_um"));
        check.holds("n_o", ordinary);
        check.holds("n_e", extraordinary);
        check.holds("theta_B_o_deg", Math.toDegrees(Math.atan(ordinary)));
        check.holds("theta_B_e_deg", Math.toDegrees(Math.atan(extraordinary)));
    }

    private static void holds(String id) {
        Check check = Checks.of(id);
        assertThat(check.ins("lambda_um")).isNotEmpty();
        check.holds(
                "n",
                check.ins("lambda_um").stream()
                        .map(wavelength -> index(check.name("material"), wavelength))
                        .toList());
    }

    private static double index(String name, double micrometres) {
        return Materials.standard().find(name).orElseThrow().index(micrometres * MICROMETRE);
    }

    private static double square(double number) {
        return number * number;
    }
}
