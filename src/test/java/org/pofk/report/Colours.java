package org.pofk.report;

/**
 * What eyes make of colours: contrast as WCAG 2.1 defines it, and distances in CIE Lab after the colour vision
 * deficiencies are simulated (Machado, Oliveira, Fernandes 2009, severity 1).
 */
final class Colours {
    private Colours() {
    }

    /** Kinds of colour vision, each with its matrix in linear light. */
    enum Eye {
        COMMON(1, 0, 0, 0, 1, 0, 0, 0, 1),
        PROTANOPE(0.152286, 1.052583, -0.204868, 0.114503, 0.786281, 0.099216, -0.003882, -0.048116, 1.051998),
        DEUTERANOPE(0.367322, 0.860646, -0.227968, 0.280085, 0.672501, 0.047413, -0.011820, 0.042940, 0.968881),
        TRITANOPE(1.255528, -0.076749, -0.178779, -0.078411, 0.930809, 0.147602, 0.004733, 0.691367, 0.303900);

        private final double[] matrix;

        Eye(double... matrix) {
            this.matrix = matrix;
        }
    }

    private static double[] linear(String colour) {
        double[] parts = new double[3];
        for (int i = 0; i < 3; i++) {
            double part = Integer.parseInt(colour.substring(1 + 2 * i, 3 + 2 * i), 16) / 255.0;
            parts[i] = part <= 0.04045 ? part / 12.92 : Math.pow((part + 0.055) / 1.055, 2.4);
        }
        return parts;
    }

    static double contrast(String one, String other) {
        double a = luminance(linear(one)) + 0.05;
        double b = luminance(linear(other)) + 0.05;
        return Math.max(a, b) / Math.min(a, b);
    }

    private static double luminance(double[] rgb) {
        return 0.2126 * rgb[0] + 0.7152 * rgb[1] + 0.0722 * rgb[2];
    }

    static double distance(Eye eye, String one, String other) {
        double[] a = lab(seen(eye, linear(one)));
        double[] b = lab(seen(eye, linear(other)));
        return Math.sqrt(Math.pow(a[0] - b[0], 2) + Math.pow(a[1] - b[1], 2) + Math.pow(a[2] - b[2], 2));
    }

    private static double[] seen(Eye eye, double[] rgb) {
        double[] seen = new double[3];
        for (int i = 0; i < 3; i++) {
            double sum = eye.matrix[3 * i] * rgb[0] + eye.matrix[3 * i + 1] * rgb[1] + eye.matrix[3 * i + 2] * rgb[2];
            seen[i] = Math.min(1, Math.max(0, sum));
        }
        return seen;
    }

    private static double[] lab(double[] rgb) {
        double x = f((0.4124 * rgb[0] + 0.3576 * rgb[1] + 0.1805 * rgb[2]) / 0.9505);
        double y = f(luminance(rgb));
        double z = f((0.0193 * rgb[0] + 0.1192 * rgb[1] + 0.9505 * rgb[2]) / 1.089);
        return new double[] {116 * y - 16, 500 * (x - y), 200 * (y - z)};
    }

    private static double f(double t) {
        return t > 0.008856 ? Math.cbrt(t) : 7.787 * t + 16 / 116.0;
    }
}
