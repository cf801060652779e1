package twofold.file;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.fail;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;
import java.util.Locale;
import java.util.Random;
import java.util.regex.Pattern;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import twofold.design.Field;
import twofold.design.Unit;

/** Numbers as files hold them: written so that the same double is read back, and as it was typed. */
class UnitPropertyTest {
    private static final int NUMBERS = 100_000;

    /** RFC 8259, section 6. */
    private static final Pattern JSON_NUMBER = Pattern.compile("-?(0|[1-9][0-9]*)(\\.[0-9]+)?([eE][-+]?[0-9]+)?");

    @ParameterizedTest
    @EnumSource(Unit.class)
    void everyDoubleReadsBackTheSame(Unit unit) {
        Random random = new Random(unit.name().hashCode());
        for (int i = 0; i < NUMBERS; i++) {
            double si = (random.nextDouble() - 0.5) * Math.pow(10, random.nextInt(40) - 20);
            String text = unit.text(si);
            if (unit.toSi(new BigDecimal(text)) != si
                    || !JSON_NUMBER.matcher(text).matches()) {
                fail(si + " is written as " + text);
            }
        }
    }

    /** No decimal of fewer digits, correctly rounded from the exact value, reads back to the same double. */
    @ParameterizedTest
    @EnumSource(Unit.class)
    void everyNumberIsAsShortAsItCanBe(Unit unit) {
        Random random = new Random(11);
        for (int i = 0; i < NUMBERS / 4; i++) {
            double plain = Math.pow(10, random.nextInt(12) - 6) * random.nextDouble();
            double si = i % 10 == 0 ? Math.scalb(1.0, random.nextInt(60) - 25) : plain;
            BigDecimal written = new BigDecimal(unit.text(si)).stripTrailingZeros();
            if (written.precision() > 1) {
                BigDecimal shorter = written.round(new MathContext(written.precision() - 1, RoundingMode.HALF_EVEN));
                if (unit.toSi(shorter) == si) {
                    fail(si + " is written as " + written + ", but " + shorter + " would do");
                }
            }
        }
    }

    /** A decimal of up to 15 digits survives a double, whatever the unit. */
    @ParameterizedTest
    @EnumSource(Unit.class)
    void whatWasTypedIsWrittenAgain(Unit unit) {
        Random random = new Random(7);
        for (int i = 0; i < NUMBERS; i++) {
            int places = random.nextInt(8);
            BigDecimal typed = BigDecimal.valueOf(random.nextInt(20_000_000) - 10_000_000, places);
            String text = unit.text(unit.toSi(typed));
            if (new BigDecimal(text).compareTo(typed) != 0) {
                fail(typed + " is written as " + text);
            }
        }
    }

    @Test
    void wellKnownStumblingBlocks() {
        assertThat(Unit.MM.text(Unit.MM.toSi(new BigDecimal("375.4")))).isEqualTo("375.4");
        assertThat(Unit.DEG.text(Math.toRadians(90))).isEqualTo("90");
        assertThat(Unit.MM.text(0.1)).isEqualTo("100");
        assertThat(Unit.ONE.text(1e-7)).isEqualTo("0.0000001");
        assertThat(Unit.ONE.text(1e300)).isEqualTo("1E300");
        assertThat(Unit.NM.text(-0.0)).isEqualTo("0");
        // A zero from below would be written as 0 and read back as another value.
        assertThat(1 / Unit.MM.toSi(new BigDecimal("-1e-400"))).isEqualTo(Double.POSITIVE_INFINITY);
        // 89° is refused, so what 89 reads as must not lie below it.
        assertThat(Field.TILT.accepts(Unit.DEG.toSi(new BigDecimal("89")))).isFalse();
        assertThat(Field.TILT.accepts(Unit.DEG.toSi(new BigDecimal("88.9999999999"))))
                .isTrue();
    }

    @Test
    void noNumberDependsOnTheLocale() {
        for (Locale locale : Texts.locales()) {
            Texts.under(locale, () -> assertThat(Unit.MM.text(1.2345678)).isEqualTo("1234.5678"));
        }
    }
}
