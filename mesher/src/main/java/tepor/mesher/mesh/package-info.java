/**
 * The finished mesh, its quality, its auditor, and the one entry point {@code Mesher}.
 *
 * <p>May not know anything of heat.
 */
package tepor.mesher.mesh;
