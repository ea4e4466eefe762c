package manyskies.flat;

import manyskies.field.ModeSpace;

/**
 * A periodic flat patch of nx by ny square pixels, and the half plane of its Fourier modes.
 *
 * <p>Modes l = 2 pi (kx / (nx d), ky / (ny d)), kx = 0 .. nx/2, ky = 0 .. ny/2, then -ny/2 + 1 ..
 * -1. Mode index = row (nx/2 + 1) + kx, where row = ky for ky &ge; 0 and ny + ky below. Convention:
 * X_l = d^2 sum_x X(x) exp(-i l.x), X(x) = (1/A) sum_l X_l exp(+i l.x), A = nx ny d^2.
 *
 * @param nx pixels along x, even
 * @param ny pixels along y, even
 * @param pixel side of a pixel in radian
 */
public record FlatGrid(int nx, int ny, double pixel) implements ModeSpace {

    /** Checks the shape. */
    public FlatGrid {
        if (nx < 4 || ny < 4 || nx % 2 != 0 || ny % 2 != 0) {
            throw new IllegalArgumentException(
                    "a patch has an even number of pixels, at least 4, along each side; found "
                            + nx
                            + " x "
                            + ny);
        }
        if (!(pixel > 0) || Double.isInfinite(pixel)) {
            throw new IllegalArgumentException("a pixel has a positive side, found " + pixel);
        }
    }

    /** Number of stored columns, nx/2 + 1. */
    public int columns() {
        return nx / 2 + 1;
    }

    @Override
    public int size() {
        return ny * columns();
    }

    /** Number of pixels. */
    public int pixels() {
        return nx * ny;
    }

    @Override
    public double area() {
        return nx * pixel * (ny * pixel);
    }

    /** Spacing of l_x. */
    public double stepX() {
        return 2 * Math.PI / (nx * pixel);
    }

    /** Spacing of l_y. */
    public double stepY() {
        return 2 * Math.PI / (ny * pixel);
    }

    /** The signed wave number ky of a row. */
    public int ky(int row) {
        return row <= ny / 2 ? row : row - ny;
    }

    /** The row of a signed wave number ky. */
    public int row(int ky) {
        return ky >= 0 ? ky : ny + ky;
    }

    /** The index of a mode. */
    public int mode(int kx, int ky) {
        return row(ky) * columns() + kx;
    }

    /** l_x of a mode. */
    public double lx(int mode) {
        return mode % columns() * stepX();
    }

    /** l_y of a mode. */
    public double ly(int mode) {
        return ky(mode / columns()) * stepY();
    }

    @Override
    public double multipole(int mode) {
        double lx = lx(mode);
        double ly = ly(mode);
        return Math.sqrt(lx * lx + ly * ly);
    }

    @Override
    public double fullSkyMultipole(int mode) {
        return multipole(mode) - 0.5;
    }

    @Override
    public int multiplicity(int mode) {
        int kx = mode % columns();
        return kx == 0 || kx == nx / 2 ? 1 : 2;
    }

    /**
     * Whether a mode lies on a Nyquist row or column. Such modes are their own conjugates in one
     * direction; derivatives and spin factors are zero there.
     */
    public boolean isNyquist(int mode) {
        return mode % columns() == nx / 2 || mode / columns() == ny / 2;
    }

    /** The largest |l| of which all modes are stored below the Nyquist rows and columns. */
    public double nyquist() {
        return Math.PI / pixel;
    }

    /**
     * The patch of the same sides, hence the same modes, with another number of pixels. Sides, and
     * so multipoles, agree to rounding only.
     *
     * @throws IllegalArgumentException if pixels would not be square, or as the constructor
     */
    public FlatGrid withPixels(int otherNx, int otherNy) {
        if ((long) otherNx * ny != (long) otherNy * nx) {
            throw new IllegalArgumentException(
                    "pixels stay square: " + otherNx + " x " + otherNy + " for " + nx + " x " + ny);
        }
        return new FlatGrid(otherNx, otherNy, pixel * nx / otherNx);
    }
}
