package twofold.design;

import static org.assertj.core.api.Assertions.assertThat;

import java.math.BigDecimal;
import java.util.List;
import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.EnumSource;
import org.junit.jupiter.params.provider.ValueSource;

class EntryTest {
    private static final Subject HERE = Subject.part(2).at("here");

    private static double number(String text, Unit unit) {
        Entry<Double> entry = Entry.number(HERE, text, unit);
        assertThat(entry.problem()).as(text).isEmpty();
        return entry.value().orElseThrow();
    }

    private static Object field(String text, Field field) {
        Entry<Object> entry = Entry.field(HERE, text, field);
        assertThat(entry.problem()).as(text).isEmpty();
        return entry.value().orElseThrow();
    }

    private static String refusal(String text, Field field) {
        Entry<Object> entry = Entry.field(HERE, text, field);
        assertThat(entry.value()).as(text).isEmpty();
        return entry.problem().orElseThrow().message();
    }

    /** The same double as the decimal on the right, in mm: an inch is 25.4 mm exactly (yard and pound agreement, 1959). */
    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            quoteCharacter = '~',
            value = {
                "2.5 | 2.5",
                "5 cm | 50",
                "5cm | 50",
                "0.2 in | 5.08",
                "0.2\" | 5.08",
                "1e3 um | 1",
                "1e3 µm | 1",
                "1E3 μm | 1",
                "375400 um | 375.4",
                ".3754 m | 375.4",
                "−3 mm | -3",
                "+3. | 3",
                "800 nm | 0.0008",
                "1e-3 m | 1"
            })
    void lengthsAreExact(String text, String millimetres) {
        assertThat(number(text, Unit.MM)).isEqualTo(Unit.MM.toSi(new BigDecimal(millimetres)));
    }

    /** A degree has 60 minutes of 60 seconds (SI brochure, 9th edition, table 8). */
    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            quoteCharacter = '~',
            value = {
                "7°30' | 7.5",
                "7° 30′ | 7.5",
                "7.5° | 7.5",
                "7.5 deg | 7.5",
                "7°30'36\" | 7.51",
                "7°30'36'' | 7.51",
                "-0°30' | -0.5",
                "90' | 1.5",
                "36\" | 0.01",
                "7°36″ | 7.01"
            })
    void anglesAreExact(String text, String degrees) {
        assertThat(number(text, Unit.DEG)).isEqualTo(Unit.DEG.toSi(new BigDecimal(degrees)));
    }

    @Test
    void otherUnits() {
        assertThat(number("0.1 rad", Unit.DEG)).isEqualTo(0.1);
        assertThat(number("2 mrad", Unit.DEG)).isEqualTo(0.002);
        assertThat(number("4", Unit.PER_M)).isEqualTo(4);
        assertThat(number("4 dpt", Unit.PER_M)).isEqualTo(4);
        assertThat(number("0.004/mm", Unit.PER_M)).isEqualTo(4);
        assertThat(number("4 1/m", Unit.PER_MM)).isEqualTo(4);
        assertThat(number("1 GHz", Unit.MHZ)).isEqualTo(1e9);
        assertThat(number("0.5 %", Unit.ONE)).isEqualTo(0.005);
        assertThat(number("1.03 µm", Unit.NM)).isEqualTo(Unit.NM.toSi(1030));
        // Seconds of arc, or inches, by what is asked for.
        assertThat(number("36\"", Unit.DEG)).isEqualTo(Unit.DEG.toSi(0.01));
        assertThat(number("36\"", Unit.MM)).isEqualTo(Unit.MM.toSi(914.4));
    }

    @ParameterizedTest
    @ValueSource(strings = {"2,5", "2,5 mm", "1,000", ",5", "1,000.5"})
    void aDecimalCommaIsRefusedAsSuch(String text) {
        assertThat(refusal(text, Field.FOCAL_LENGTH)).contains("found \"" + text + "\"", "comma", "as in 2.5");
    }

    @Test
    void whatIsNoNumberSaysWhatIs() {
        assertThat(refusal("abc", Field.INSIDE))
                .isEqualTo(
                        "found \"abc\", which is no number; accepted: a number above 0, up to 1000000, in mm, or with a "
                                + "unit: mm, cm, m, µm, nm, in");
        assertThat(refusal("5 kg", Field.INSIDE)).contains("whose unit \"kg\" does not belong here");
        assertThat(refusal("5 MM", Field.INSIDE)).contains("whose unit \"MM\"");
        assertThat(refusal("5 °", Field.INSIDE)).contains("whose unit \"°\"");
        assertThat(refusal("", Field.INSIDE)).contains("found nothing");
        assertThat(refusal("1e9999", Field.FOCAL_LENGTH)).contains("too large");
        assertThat(refusal("NaN", Field.FOCAL_LENGTH)).contains("which is no number");
        assertThat(refusal("7°60'", Field.TILT)).contains("60 minutes");
        assertThat(refusal("7°30'60\"", Field.TILT)).contains("60 minutes or seconds");
        assertThat(refusal("1 2", Field.INSIDE)).contains("whose unit \"2\"");
        assertThat(refusal("9".repeat(500), Field.INSIDE)).contains("found 500 characters");
    }

    @Test
    void limitsAreTheFields() {
        assertThat(refusal("2000 m", Field.INSIDE))
                .startsWith("found 2000 m; accepted: a number above 0, up to 1000000");
        assertThat(refusal("0", Field.INSIDE)).contains("above 0");
        assertThat(refusal("89°", Field.FACES)).contains("below 89", "\"brewster\"");
        assertThat(refusal("-1", Field.ALONG)).contains("\"middle\"");
        assertThat(refusal("1.2", Field.REFLECTANCE)).contains("from 0 to 1");
    }

    @Test
    void formsOfEveryKind() {
        assertThat(field("flat", Field.ROC)).isEqualTo(Double.POSITIVE_INFINITY);
        assertThat(field("∞", Field.ROC)).isEqualTo(Double.POSITIVE_INFINITY);
        assertThat(field("-10 cm", Field.ROC)).isEqualTo(-0.1);
        assertThat(field("Middle", Field.ALONG)).isEqualTo(Along.MIDDLE);
        assertThat(field("5 cm", Field.ALONG)).isEqualTo(Along.at(0.05));
        assertThat(field("brewster", Field.FACES)).isEqualTo(FaceAngle.BREWSTER);
        assertThat(field("0.5 rad", Field.FACES)).isEqualTo(FaceAngle.of(0.5));
        assertThat(field("[480, 0]", Field.AT)).isEqualTo(new Point(0.48, 0));
        assertThat(field("48 cm; 1 in", Field.AT)).isEqualTo(new Point(0.48, 0.0254));
        assertThat(field("480 -20", Field.AT)).isEqualTo(new Point(0.48, -0.02));
        assertThat(field("48 x 25", Field.MOUNT)).isEqualTo(new Mount(0.048, 0.025));
        assertThat(field("48×25", Field.MOUNT)).isEqualTo(new Mount(0.048, 0.025));
        assertThat(field("2", Field.THERMAL_POWER)).isEqualTo(new TwoPowers(2, 2));
        assertThat(field("2; 3 dpt", Field.THERMAL_POWER)).isEqualTo(new TwoPowers(2, 3));
        assertThat(field("1, 50, 0, 1", Field.TANGENTIAL)).isEqualTo(new FourNumbers(1, 0.05, 0, 1));
        assertThat(field("1; 5 cm; -0.01/mm; 0.5", Field.SAGITTAL)).isEqualTo(new FourNumbers(1, 0.05, -10, 0.5));
        assertThat(field("sagittal", Field.TILT_PLANE)).isEqualTo(TiltPlane.SAGITTAL);
        assertThat(field("Up", Field.SIDE)).isEqualTo(Side.UP);
        assertThat(field(" YAG ", Field.MATERIAL)).isEqualTo("YAG");
        assertThat(refusal("1, 2, 3", Field.AT)).contains("two numbers", "semicolons between");
        assertThat(refusal("2,5; 3", Field.AT)).contains("comma");
        assertThat(refusal("1, 50, 0", Field.TANGENTIAL)).contains("[A, B, C, D]");
        assertThat(refusal("sagital", Field.TILT_PLANE)).contains("nearest is \"sagittal\"");
        assertThat(refusal("", Field.MATERIAL)).contains("found nothing");
        assertThat(Entry.field(HERE, "1, x", Field.AT).problem().orElseThrow().where())
                .isEqualTo(HERE.at(1));
    }

    /** What is shown for typing over reads back to the very same value. */
    @ParameterizedTest
    @EnumSource(Field.class)
    void textReadsBack(Field field) {
        SplittableRandom random = new SplittableRandom(field.name().hashCode());
        for (int i = 0; i < 200; i++) {
            double a = random.nextDouble(1e-6, 1);
            double b = random.nextDouble(1e-6, 1);
            Object value = switch (field.form()) {
                case NUMBER, POSITIVE, SIGNED -> field == Field.INDEX ? 1 + a : a;
                case POINT -> new Point(a, -b);
                case MOUNT -> new Mount(a, b);
                case ALONG -> i == 0 ? Along.MIDDLE : Along.at(a);
                case FACE_ANGLE -> i == 0 ? FaceAngle.BREWSTER : FaceAngle.of(a);
                case POWERS -> i == 0 ? new TwoPowers(a, a) : new TwoPowers(a, -b);
                case MATRIX -> new FourNumbers(a, b, -a, b);
                case TILT_PLANE -> List.of(TiltPlane.values()).get(i % 2);
                case SIDE -> List.of(Side.values()).get(i % 4);
                case TURN -> List.of(Turn.values()).get(i % 2);
                case TEXT -> "YAG";
            };
            assertThat(field(Entry.text(field, value), field)).isEqualTo(value);
        }
        if (field == Field.ROC) {
            assertThat(field(Entry.text(field, Double.POSITIVE_INFINITY), field))
                    .isEqualTo(Double.POSITIVE_INFINITY);
        }
    }
}
