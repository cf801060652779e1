package twofold.study;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import twofold.Allocated;
import twofold.bench.TwelvePartWave;
import twofold.cavity.Chain;
import twofold.cavity.Fit;
import twofold.cavity.Trial;
import twofold.design.Field;
import twofold.design.Lever;
import twofold.design.Place;
import twofold.layout.Layout;
import twofold.optics.Plane;

/** Setting fields, and moving rigid arms, allocates nothing: maps of millions of points make no garbage. */
class SettingAllocationTest {
    @BeforeAll
    static void everyKindOfCavityWasWalked() {
        Allocated.seeEveryKind();
    }

    @ParameterizedTest
    @CsvSource({
        "focal_length_mm, Lens, '', 4000",
        "length_mm, Pumped, '', 9",
        "index, Rod 0, '', 1.5",
        "thermal_power_per_m, Pumped, '', 0.2",
        "x_mm, M5, '', 0",
        "leg_mm, M3, M4, 201",
        "incidence_deg, M2, '', 29",
    })
    void settingAllocatesNothing(String set, String first, String second, double value) {
        Chain chain = Chain.of(Layout.of(TwelvePartWave.design()).value().orElseThrow());
        Place place = second.isEmpty() ? Place.of(first) : Place.of(first, second);
        Lever lever = new Lever("moved", set, List.of(place), new Lever.Range.Among(List.of(1.0)), false);
        Trial trial = chain.trial();
        Setting setting = Setting.of(chain, List.of(lever));
        double[] values = {Field.settableUnit(set).orElseThrow().toSi(value)};
        double si = set.equals("x_mm") ? trial.get(chain.x(chain.part("M5"))) : values[0];
        values[0] = si;
        assertThat(setting.set(values, trial)).isTrue();
        assertThat(trial.run()).isEqualTo(Fit.FITS);
        Allocated.nothing(i -> {
            values[0] = si * (1 + 1e-9 * (i % 7));
            return setting.set(values, trial) && trial.run() == Fit.FITS
                    ? trial.halfTrace(Plane.TANGENTIAL)
                    : Double.NaN;
        });
    }
}
