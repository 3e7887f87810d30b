package tepor.solver.element;

import java.util.Arrays;

/** Six-node triangle: corners λᵢ(2λᵢ − 1), middle of the side opposite corner i: 4λᵢ₊₁λᵢ₊₂. */
final class QuadraticTriangle implements TriangleShape {
    static final QuadraticTriangle SHAPE = new QuadraticTriangle();

    private QuadraticTriangle() {}

    @Override
    public int nodeCount() {
        return 6;
    }

    @Override
    public void values(double l0, double l1, double l2, double[] out) {
        out[0] = l0 * (2 * l0 - 1);
        out[1] = l1 * (2 * l1 - 1);
        out[2] = l2 * (2 * l2 - 1);
        out[3] = 4 * l1 * l2;
        out[4] = 4 * l2 * l0;
        out[5] = 4 * l0 * l1;
    }

    @Override
    public void slopes(double l0, double l1, double l2, double[] out) {
        Arrays.fill(out, 0, 18, 0);
        out[0] = 4 * l0 - 1;
        out[4] = 4 * l1 - 1;
        out[8] = 4 * l2 - 1;
        out[10] = 4 * l2;
        out[11] = 4 * l1;
        out[12] = 4 * l2;
        out[14] = 4 * l0;
        out[15] = 4 * l1;
        out[16] = 4 * l0;
    }

    @Override
    public int stiffnessDegree() {
        return 2;
    }
}
