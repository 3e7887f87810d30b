package tepor.solver.bracket;

import java.util.Arrays;
import tepor.solver.model.Case;
import tepor.solver.model.Conductivity;
import tepor.solver.model.Region;
import tepor.solver.model.Values;

/** How each region of a section conducts: its conductivity tensor, W/(m·K). */
final class RegionConduction {
    private final double[] along;
    private final double[] across;
    private final double[] angle;

    RegionConduction(Case subject, Values values) {
        int count = subject.regions().size();
        along = new double[count];
        across = new double[count];
        angle = new double[count];
        for (Region region : subject.regions()) {
            if (region.isHole()) {
                continue;
            }
            int i = region.index();
            if (region.material().conductivity() instanceof Conductivity.Directional k) {
                along[i] = values.of(k.along());
                across[i] = values.of(k.across());
                angle[i] = values.of(k.angle());
            } else if (region.material().conductivity() instanceof Conductivity.Uniform k) {
                along[i] = values.of(k.k());
                across[i] = along[i];
            }
        }
    }

    /** Whether every region conducts alike in all directions. */
    boolean isUniform() {
        return Arrays.equals(along, across);
    }

    /** d·K·d for the unit vector d at an angle (radians) from +x: what a temperature that varies along d alone meets. */
    double conductivity(int region, double direction) {
        if (along[region] == across[region]) {
            return along[region];
        }
        double c = Math.cos(direction - angle[region]);
        double s = Math.sin(direction - angle[region]);
        return along[region] * c * c + across[region] * s * s;
    }

    /** d·K⁻¹·d: what a flux along d alone meets, m·K/W. */
    double resistivity(int region, double direction) {
        if (along[region] == across[region]) {
            return 1 / along[region];
        }
        double c = Math.cos(direction - angle[region]);
        double s = Math.sin(direction - angle[region]);
        return c * c / along[region] + s * s / across[region];
    }
}
