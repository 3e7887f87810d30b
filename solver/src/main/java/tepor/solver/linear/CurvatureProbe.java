package tepor.solver.linear;

import no.uib.cipr.matrix.AbstractMatrix;
import no.uib.cipr.matrix.Vector;

/** A matrix that looks at pᵀAp while conjugate gradients multiply by it, and refuses directions where it is not positive. */
final class CurvatureProbe extends AbstractMatrix {
    private final SymmetricMatrix a;

    CurvatureProbe(SymmetricMatrix a) {
        super(a);
        this.a = a;
    }

    /** Thrown where pᵀAp is not positive. */
    static final class NotPositiveException extends ArithmeticException {
        NotPositiveException(double curvature) {
            super("a direction p with pᵀAp = " + curvature);
        }
    }

    @Override
    public double get(int row, int column) {
        return a.get(row, column);
    }

    /** @throws NotPositiveException where xᵀAx is not positive */
    @Override
    public Vector mult(Vector x, Vector y) {
        a.mult(x, y);
        double curvature = x.dot(y);
        if (!(curvature > 0)) {
            throw new NotPositiveException(curvature);
        }
        return y;
    }

    @Override
    public Vector multAdd(double alpha, Vector x, Vector y) {
        return a.multAdd(alpha, x, y);
    }
}
