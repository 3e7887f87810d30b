package tepor.solver.element;

import java.util.Arrays;

/** Three-node triangle: Nᵢ = λᵢ. */
final class LinearTriangle implements TriangleShape {
    static final LinearTriangle SHAPE = new LinearTriangle();

    private LinearTriangle() {}

    @Override
    public int nodeCount() {
        return 3;
    }

    @Override
    public void values(double l0, double l1, double l2, double[] out) {
        out[0] = l0;
        out[1] = l1;
        out[2] = l2;
    }

    @Override
    public void slopes(double l0, double l1, double l2, double[] out) {
        Arrays.fill(out, 0, 9, 0);
        out[0] = 1;
        out[4] = 1;
        out[8] = 1;
    }

    @Override
    public int stiffnessDegree() {
        return 1;
    }
}
