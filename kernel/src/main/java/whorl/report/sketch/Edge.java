package whorl.report.sketch;

import org.apache.commons.math3.geometry.euclidean.threed.Vector3D;

/**
 * A straight piece of a line on a surface, seen.
 *
 * @param outward where a line just outside the surface lies from it; zero where the surface has a
 *     corner there
 * @param contour whether it is where a surface turns away from the onlooker
 */
record Edge(Vector3D from, Vector3D to, Vector3D outward, boolean contour) {}
