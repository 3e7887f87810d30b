/**
 * Drawings in DXF, text form: the pairs of group code and value, the entities they make, and the outline drawn by them.
 *
 * <p>What the group codes mean is taken from the published reference of the format (DXF Reference, Autodesk, releases R12 to
 * 2018), as remembered. May not know how regions lie over each other.
 */
package tepor.mesher.dxf;
