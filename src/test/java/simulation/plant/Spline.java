package simulation.plant;

/** Natural cubic spline through given points; outside them it goes on straight. */
final class Spline {

    private final double[] x;
    private final double[] y;
    private final double[] curvature;

    Spline(double[] x, double[] y) {
        this.x = x.clone();
        this.y = y.clone();
        this.curvature = curvature(x, y);
    }

    private static double[] curvature(double[] x, double[] y) {
        int n = x.length;
        double[] second = new double[n];
        double[] u = new double[n];
        for (int i = 1; i < n - 1; i++) {
            double share = (x[i] - x[i - 1]) / (x[i + 1] - x[i - 1]);
            double pivot = share * second[i - 1] + 2;
            second[i] = (share - 1) / pivot;
            double bend = (y[i + 1] - y[i]) / (x[i + 1] - x[i]) - (y[i] - y[i - 1]) / (x[i] - x[i - 1]);
            u[i] = (6 * bend / (x[i + 1] - x[i - 1]) - share * u[i - 1]) / pivot;
        }
        second[n - 1] = 0;
        for (int i = n - 2; i >= 0; i--) {
            second[i] = second[i] * second[i + 1] + u[i];
        }
        return second;
    }

    double at(double where) {
        int i = below(where);
        double h = x[i + 1] - x[i];
        if (where < x[0] || where > x[x.length - 1]) {
            double end = where < x[0] ? x[0] : x[x.length - 1];
            return at(end) + slope(end) * (where - end);
        }
        double a = (x[i + 1] - where) / h;
        double b = (where - x[i]) / h;
        return a * y[i]
                + b * y[i + 1]
                + ((a * a * a - a) * curvature[i] + (b * b * b - b) * curvature[i + 1]) * h * h / 6;
    }

    double slope(double where) {
        double inside = Math.min(Math.max(where, x[0]), x[x.length - 1]);
        int i = below(inside);
        double h = x[i + 1] - x[i];
        double a = (x[i + 1] - inside) / h;
        double b = (inside - x[i]) / h;
        return (y[i + 1] - y[i]) / h + ((3 * b * b - 1) * curvature[i + 1] - (3 * a * a - 1) * curvature[i]) * h / 6;
    }

    private int below(double where) {
        int low = 0;
        int high = x.length - 1;
        while (high - low > 1) {
            int middle = (low + high) >>> 1;
            if (x[middle] > where) {
                high = middle;
            } else {
                low = middle;
            }
        }
        return low;
    }
}
