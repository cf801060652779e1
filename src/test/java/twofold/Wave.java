package twofold;

/** Light of one transverse dimension on an even grid whose middle sample lies on the axis; phases run as exp(+ikz). */
final class Wave {
    /** Samples of a wave, and half the width of a grid in beam radii: exp(−5.5²) is 7e-14. */
    private static final int SAMPLES = 900;

    private static final double REACH = 5.5;

    private final double step;
    private final double[] re;
    private final double[] im;

    private Wave(double step, double[] re, double[] im) {
        this.step = step;
        this.re = re;
        this.im = im;
    }

    /** A real Gaussian of a radius on a grid that fits it. */
    static Wave gaussian(double radius) {
        return gaussian(radius, REACH * radius / (SAMPLES / 2));
    }

    /** A real Gaussian of a radius on a grid. */
    static Wave gaussian(double radius, double step) {
        Wave wave = new Wave(step, new double[SAMPLES], new double[SAMPLES]);
        for (int i = 0; i < SAMPLES; i++) {
            double x = wave.x(i) / radius;
            wave.re[i] = Math.exp(-x * x);
        }
        return wave;
    }

    /** Distance of samples, m. */
    double step() {
        return step;
    }

    private double x(int i) {
        return (i - SAMPLES / 2) * step;
    }

    double power() {
        double sum = 0;
        for (int i = 0; i < SAMPLES; i++) {
            sum += re[i] * re[i] + im[i] * im[i];
        }
        return sum * step;
    }

    /** Twice the root of the second moment: the 1/e² radius of a Gaussian. */
    double radius() {
        double sum = 0;
        for (int i = 0; i < SAMPLES; i++) {
            sum += x(i) * x(i) * (re[i] * re[i] + im[i] * im[i]);
        }
        return 2 * Math.sqrt(sum * step / power());
    }

    /** This wave conjugated, times another, summed over the axis: real and imaginary part. */
    double[] times(Wave other) {
        double real = 0;
        double imaginary = 0;
        for (int i = 0; i < SAMPLES; i++) {
            real += re[i] * other.re[i] + im[i] * other.im[i];
            imaginary += re[i] * other.im[i] - im[i] * other.re[i];
        }
        return new double[] {real * step, imaginary * step};
    }

    /** Times exp(iπx²·curvature/λ). */
    Wave screened(double curvature, double wavelength) {
        double[] real = new double[SAMPLES];
        double[] imaginary = new double[SAMPLES];
        for (int i = 0; i < SAMPLES; i++) {
            double phase = Math.PI * x(i) * x(i) * curvature / wavelength;
            real[i] = re[i] * Math.cos(phase) - im[i] * Math.sin(phase);
            imaginary[i] = re[i] * Math.sin(phase) + im[i] * Math.cos(phase);
        }
        return new Wave(step, real, imaginary);
    }

    /** The same wave over an axis stretched by a factor, its power kept. */
    Wave stretched(double by) {
        double[] real = new double[SAMPLES];
        double[] imaginary = new double[SAMPLES];
        for (int i = 0; i < SAMPLES; i++) {
            real[i] = re[i] / Math.sqrt(by);
            imaginary[i] = im[i] / Math.sqrt(by);
        }
        return new Wave(step * by, real, imaginary);
    }

    /** Behind a free path of a wavelength in the medium, on a grid fitted to what the wave's own moments foretell. */
    Wave gone(double path, double wavelength) {
        double next = REACH * foretold(path, wavelength) / (SAMPLES / 2);
        double[] real = new double[SAMPLES];
        double[] imaginary = new double[SAMPLES];
        double scale = step / Math.sqrt(wavelength * path) * Math.sqrt(0.5);
        for (int j = 0; j < SAMPLES; j++) {
            double out = (j - SAMPLES / 2) * next;
            double r = 0;
            double s = 0;
            for (int i = 0; i < SAMPLES; i++) {
                double phase = Math.PI * (out - x(i)) * (out - x(i)) / (wavelength * path);
                double cos = Math.cos(phase);
                double sin = Math.sin(phase);
                r += re[i] * cos - im[i] * sin;
                s += re[i] * sin + im[i] * cos;
            }
            // 1/√i = (1 − i)/√2
            real[j] = scale * (r + s);
            imaginary[j] = scale * (s - r);
        }
        return new Wave(next, real, imaginary);
    }

    /** The radius behind a path, from this wave's moments of place and direction; only the next grid rests on it. */
    private double foretold(double path, double wavelength) {
        double xx = 0;
        double xt = 0;
        double tt = 0;
        double k = 2 * Math.PI / wavelength;
        for (int i = 1; i < SAMPLES - 1; i++) {
            double dr = (re[i + 1] - re[i - 1]) / (2 * step);
            double ds = (im[i + 1] - im[i - 1]) / (2 * step);
            xx += x(i) * x(i) * (re[i] * re[i] + im[i] * im[i]);
            xt += x(i) * (re[i] * ds - im[i] * dr) / k;
            tt += (dr * dr + ds * ds) / (k * k);
        }
        return 2 * Math.sqrt((xx + 2 * path * xt + path * path * tt) * step / power());
    }
}
