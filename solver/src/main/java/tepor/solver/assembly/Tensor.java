package tepor.solver.assembly;

import tepor.solver.model.Conductivity;
import tepor.solver.model.Input;
import tepor.solver.model.Values;

/**
 * A symmetric conductivity tensor, W/(m·K).
 *
 * @param xx component
 * @param xy component
 * @param yy component
 */
public record Tensor(double xx, double xy, double yy) {
    /** The conductivity of a material for given values. */
    public static Tensor of(Conductivity conductivity, Values values) {
        if (conductivity instanceof Conductivity.Directional d) {
            return turned(values.of(d.along()), values.of(d.across()), values.of(d.angle()));
        }
        double k = values.of(((Conductivity.Uniform) conductivity).k());
        return new Tensor(k, 0, k);
    }

    /** Its derivative by an input; null where it does not depend on it. */
    public static Tensor derivative(Conductivity conductivity, Values values, Input input) {
        if (conductivity instanceof Conductivity.Directional d) {
            double angle = values.of(d.angle());
            if (input.equals(d.along())) {
                return turned(1, 0, angle);
            }
            if (input.equals(d.across())) {
                return turned(0, 1, angle);
            }
            if (input.equals(d.angle())) {
                double difference = values.of(d.along()) - values.of(d.across());
                double sin2 = Math.sin(2 * angle);
                return new Tensor(-difference * sin2, difference * Math.cos(2 * angle), difference * sin2);
            }
            return null;
        }
        return input.equals(((Conductivity.Uniform) conductivity).k()) ? new Tensor(1, 0, 1) : null;
    }

    private static Tensor turned(double along, double across, double angle) {
        double c = Math.cos(angle);
        double s = Math.sin(angle);
        return new Tensor(along * c * c + across * s * s, (along - across) * c * s, along * s * s + across * c * c);
    }

    /** Conductivity in a direction of unit length, W/(m·K). */
    public double inDirection(double nx, double ny) {
        return xx * nx * nx + 2 * xy * nx * ny + yy * ny * ny;
    }
}
