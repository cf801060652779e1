package twofold.layout;

import org.apache.commons.math3.linear.Array2DRowRealMatrix;
import org.apache.commons.math3.linear.SingularValueDecomposition;

/**
 * The shortest step that solves linear equations, or that misses them least where they contradict each other: the
 * pseudo-inverse of their matrix. One that is well conditioned is solved by its normal equations (Cholesky); any other, as of
 * redundant equations, by singular values. Works in place; confined to a thread.
 */
final class LeastStep {
    /** Pivots of the normal equations below this share of the largest are left to singular values. */
    private static final double WELL = 1e-6;

    /** Singular values below this share of the largest count as 0: equations that say the same. */
    private static final double SAME = 1e-9;

    private final int rows;
    private final int columns;
    final double[][] matrix;
    private final double[][] lower;
    private final double[] work;

    LeastStep(int rows, int columns) {
        this.rows = rows;
        this.columns = columns;
        matrix = new double[rows][columns];
        lower = new double[rows][rows];
        work = new double[rows];
    }

    /**
     * The step.
     *
     * @param right sides of the equations, one a row
     * @param step takes it
     */
    void solve(double[] right, double[] step) {
        if (rows <= columns && factored()) {
            normal(right, step);
        } else {
            singular(right, step);
        }
    }

    private boolean factored() {
        double largest = 0;
        for (int r = 0; r < rows; r++) {
            for (int c = 0; c <= r; c++) {
                double sum = 0;
                for (int k = 0; k < columns; k++) {
                    sum += matrix[r][k] * matrix[c][k];
                }
                lower[r][c] = sum;
            }
            largest = Math.max(largest, lower[r][r]);
        }
        for (int c = 0; c < rows; c++) {
            double pivot = lower[c][c];
            for (int k = 0; k < c; k++) {
                pivot -= lower[c][k] * lower[c][k];
            }
            if (!(pivot > WELL * largest)) {
                return false;
            }
            lower[c][c] = Math.sqrt(pivot);
            for (int r = c + 1; r < rows; r++) {
                double sum = lower[r][c];
                for (int k = 0; k < c; k++) {
                    sum -= lower[r][k] * lower[c][k];
                }
                lower[r][c] = sum / lower[c][c];
            }
        }
        return true;
    }

    private void normal(double[] right, double[] step) {
        for (int r = 0; r < rows; r++) {
            double sum = right[r];
            for (int k = 0; k < r; k++) {
                sum -= lower[r][k] * work[k];
            }
            work[r] = sum / lower[r][r];
        }
        for (int r = rows - 1; r >= 0; r--) {
            double sum = work[r];
            for (int k = r + 1; k < rows; k++) {
                sum -= lower[k][r] * work[k];
            }
            work[r] = sum / lower[r][r];
        }
        for (int c = 0; c < columns; c++) {
            double sum = 0;
            for (int r = 0; r < rows; r++) {
                sum += matrix[r][c] * work[r];
            }
            step[c] = sum;
        }
    }

    private void singular(double[] right, double[] step) {
        SingularValueDecomposition svd = new SingularValueDecomposition(new Array2DRowRealMatrix(matrix, false));
        double[] values = svd.getSingularValues();
        double[] parts = svd.getUT().operate(right);
        for (int i = 0; i < values.length; i++) {
            parts[i] = values[i] > SAME * values[0] ? parts[i] / values[i] : 0;
        }
        System.arraycopy(svd.getV().operate(parts), 0, step, 0, columns);
    }
}
