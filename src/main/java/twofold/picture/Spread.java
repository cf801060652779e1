package twofold.picture;

import java.util.Arrays;

/** Labels along a line, moved apart as little as can be. */
final class Spread {
    private Spread() {}

    /**
     * Where labels go so that none touches the next: the least sum of squared moves, found by pooling those that would
     * overlap, as in isotonic regression.
     *
     * @param wishes their middles, ascending
     * @param sizes how long each is
     * @param gap between two
     * @param from where the first may begin
     * @param to where the last may end
     * @return their middles; empty where they do not fit
     */
    static double[] apart(double[] wishes, double[] sizes, double gap, double from, double to) {
        int n = wishes.length;
        double total = gap * Math.max(0, n - 1);
        for (double size : sizes) {
            total += size;
        }
        if (n == 0 || total > to - from) {
            return new double[0];
        }
        // Where a label would be if all before it had no length; these have to ascend.
        double[] offset = new double[n];
        for (int i = 1; i < n; i++) {
            offset[i] = offset[i - 1] + (sizes[i - 1] + sizes[i]) / 2 + gap;
        }
        double[] mean = new double[n];
        int[] count = new int[n];
        int blocks = 0;
        for (int i = 0; i < n; i++) {
            mean[blocks] = wishes[i] - offset[i];
            count[blocks++] = 1;
            while (blocks > 1 && mean[blocks - 2] > mean[blocks - 1]) {
                int both = count[blocks - 2] + count[blocks - 1];
                mean[blocks - 2] = (mean[blocks - 2] * count[blocks - 2] + mean[blocks - 1] * count[blocks - 1]) / both;
                count[blocks - 2] = both;
                blocks--;
            }
        }
        double least = from + sizes[0] / 2;
        double most = to - sizes[n - 1] / 2 - offset[n - 1];
        double[] middles = new double[n];
        int at = 0;
        for (int b = 0; b < blocks; b++) {
            double start = Math.min(most, Math.max(least, mean[b]));
            Arrays.fill(middles, at, at + count[b], start);
            at += count[b];
        }
        for (int i = 0; i < n; i++) {
            middles[i] += offset[i];
        }
        return middles;
    }
}
