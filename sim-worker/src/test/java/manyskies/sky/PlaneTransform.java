package manyskies.sky;

import java.util.Arrays;
import manyskies.flat.FlatGrid;
import manyskies.flat.MapTransform;
import manyskies.flat.ModeDisc;
import org.jtransforms.fft.DoubleFFT_2D;

/** The obvious transform: a complex one of the whole plane. A second method, for tests. */
public final class PlaneTransform implements MapTransform {
    private final FlatGrid grid;
    private final DoubleFFT_2D fft;
    private final double[] plane;

    /** A transform of a grid. */
    public PlaneTransform(FlatGrid grid) {
        this.grid = grid;
        fft = new DoubleFFT_2D(grid.ny(), grid.nx());
        plane = new double[2 * grid.pixels()];
    }

    @Override
    public FlatGrid grid() {
        return grid;
    }

    @Override
    public void toMap(double[] modes, ModeDisc disc, double[] map) {
        Arrays.fill(plane, 0);
        for (int ky = -disc.maxKy(); ky <= disc.maxKy(); ky++) {
            for (int kx = -disc.last(ky); kx <= disc.last(ky); kx++) {
                int from = 2 * (kx >= 0 ? grid.mode(kx, ky) : grid.mode(-kx, -ky));
                int to =
                        2
                                * (Math.floorMod(ky, grid.ny()) * grid.nx()
                                        + Math.floorMod(kx, grid.nx()));
                plane[to] = modes[from];
                plane[to + 1] = kx >= 0 ? modes[from + 1] : -modes[from + 1];
            }
        }
        fft.complexInverse(plane, false);
        for (int i = 0; i < map.length; i++) {
            map[i] = plane[2 * i] / grid.area();
        }
    }

    @Override
    public void toModes(double[] map, ModeDisc disc, double[] modes) {
        for (int i = 0; i < map.length; i++) {
            plane[2 * i] = map[i];
            plane[2 * i + 1] = 0;
        }
        fft.complexForward(plane);
        double pixel = grid.pixel() * grid.pixel();
        for (int ky = -disc.maxKy(); ky <= disc.maxKy(); ky++) {
            for (int kx = 0; kx <= disc.last(ky); kx++) {
                int from = 2 * (Math.floorMod(ky, grid.ny()) * grid.nx() + kx);
                int to = 2 * grid.mode(kx, ky);
                modes[to] = pixel * plane[from];
                modes[to + 1] = pixel * plane[from + 1];
            }
        }
    }
}
