package tepor.mesher.mesh;

import java.util.function.BooleanSupplier;
import tepor.mesher.section.Section;

/** Makes the mesh of a section. */
public final class Mesher {
    private Mesher() {}

    /**
     * Meshes a section.
     *
     * @param section the section
     * @param options what is asked of the mesh
     * @param stopped asked now and then whether to stop
     * @throws java.util.concurrent.CancellationException if told to stop
     */
    public static MeshResult mesh(Section section, MeshOptions options, BooleanSupplier stopped) {
        throw new IllegalStateException("not joined yet");
    }
}
