package twofold.study;

import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.function.Function;
import twofold.cavity.Chain;
import twofold.cavity.Fit;
import twofold.cavity.Reading;
import twofold.cavity.Trial;
import twofold.design.Lever;
import twofold.layout.Laid;

/** Sets levers and reads quantities; confined to a thread. */
public interface Asker {
    /**
     * Sets the levers and reads the quantities.
     *
     * @param values of the levers, in SI
     * @param answers takes the quantities, in SI, from an index on; NaN where undefined, as where there is no such layout
     * @param at the index
     */
    void ask(double[] values, double[] answers, int at);

    /**
     * An asker.
     *
     * @param laid the design as it stands
     * @param levers of it, set together
     * @param readings by the chain to read
     */
    static Asker of(Laid laid, List<Lever> levers, List<Function<Chain, Reading>> readings) {
        Chain chain = Chain.of(laid);
        return levers.stream().allMatch(l -> Setting.canSet(chain, l))
                ? onTrials(chain, levers, readings)
                : onDesigns(laid, levers, readings);
    }

    private static Asker onTrials(Chain chain, List<Lever> levers, List<Function<Chain, Reading>> readings) {
        Setting setting = Setting.of(chain, levers);
        Trial trial = chain.trial();
        Reading[] compiled = readings.stream().map(r -> r.apply(chain)).toArray(Reading[]::new);
        return (values, answers, at) -> {
            if (!setting.set(values, trial) || trial.run() != Fit.FITS) {
                Arrays.fill(answers, at, at + compiled.length, Double.NaN);
                return;
            }
            for (int i = 0; i < compiled.length; i++) {
                answers[at + i] = compiled[i].of(trial);
            }
        };
    }

    /** For what light does not feel, as the clear diameter that clips it: no number of a trial, so a design each time. */
    private static Asker onDesigns(Laid laid, List<Lever> levers, List<Function<Chain, Reading>> readings) {
        return (values, answers, at) -> {
            Optional<Laid> now = Levered.of(laid, levers, values).value();
            if (now.isEmpty()) {
                Arrays.fill(answers, at, at + readings.size(), Double.NaN);
                return;
            }
            Chain chain = Chain.of(now.get());
            Trial trial = chain.trial();
            trial.run();
            for (int i = 0; i < readings.size(); i++) {
                answers[at + i] = readings.get(i).apply(chain).of(trial);
            }
        };
    }
}
