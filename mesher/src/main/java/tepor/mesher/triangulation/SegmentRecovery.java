package tepor.mesher.triangulation;

import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Deque;
import java.util.List;

/**
 * Makes a Delaunay triangulation a constrained one: turns the sides that cross a segment until the segment is there, then
 * restores the Delaunay property beside it.
 *
 * <p>Source: Sloan 1993, <em>A fast algorithm for generating constrained Delaunay triangulations</em>, Computers & Structures
 * 47:441–450. A vertex that lies exactly on a segment divides it.
 */
final class SegmentRecovery {
    private final Triangulation mesh;
    private final Predicates predicates;
    /** For each vertex a side that has it for its apex. */
    private final int[] sideAt;

    /** A side by its ends, which stays true while sides are turned. */
    private record Ends(int from, int to) {}

    SegmentRecovery(Triangulation mesh, Predicates predicates) {
        this.mesh = mesh;
        this.predicates = predicates;
        sideAt = new int[mesh.vertexCount()];
        for (int t = 0; t < mesh.triangleCount(); t++) {
            note(t);
        }
    }

    /**
     * Makes a segment a side, or several in a row, of the triangulation, and marks them.
     *
     * @param code constraint code for the direction from → to; even
     * @throws IllegalArgumentException if the segment crosses or overlaps one that is there already
     */
    void recover(int from, int to, int code) {
        int at = from;
        while (at != to) {
            at = advance(at, to, code);
        }
    }

    private int advance(int from, int to, int code) {
        int first = sideAt[from];
        int side = first;
        do {
            int u = mesh.origin(side);
            int w = mesh.destination(side);
            if (u == to) {
                mark(Triangulation.previous(side), code);
                return to;
            }
            double uTurn = u < 0 ? Double.NaN : turn(from, to, u);
            double wTurn = w < 0 ? Double.NaN : turn(from, to, w);
            if (uTurn == 0 && isAhead(from, to, u)) {
                mark(Triangulation.previous(side), code);
                return u;
            }
            if (uTurn < 0 && wTurn > 0) {
                return cut(from, to, side, code);
            }
            // The next triangle about the vertex, counter-clockwise; the vertex is corner `side` of this one.
            side = Triangulation.next(mesh.twin(Triangulation.next(side)));
        } while (side != first);
        throw new IllegalStateException("no way from vertex " + from + " towards vertex " + to);
    }

    private int cut(int from, int to, int firstCrossed, int code) {
        Deque<Ends> crossing = new ArrayDeque<>();
        int side = firstCrossed;
        int target = Triangulation.NONE;
        while (target < 0) {
            if (mesh.constraint(side) >= 0) {
                throw new IllegalArgumentException("segments cross: number " + code / 2 + " and number "
                        + mesh.constraint(side) / 2 + ", near (" + mesh.x(mesh.origin(side)) + " "
                        + mesh.y(mesh.origin(side)) + ")");
            }
            crossing.add(new Ends(mesh.origin(side), mesh.destination(side)));
            int other = mesh.twin(side);
            int z = mesh.apex(other);
            double zTurn = z == to ? 0 : turn(from, to, z);
            if (zTurn == 0) {
                target = z;
            } else {
                side = zTurn > 0 ? Triangulation.next(other) : Triangulation.previous(other);
            }
        }
        List<Ends> made = turnAside(from, target, crossing);
        mark(find(new Ends(from, target)), code);
        restore(made);
        return target;
    }

    private List<Ends> turnAside(int from, int target, Deque<Ends> crossing) {
        List<Ends> made = new ArrayList<>();
        while (!crossing.isEmpty()) {
            Ends ends = crossing.remove();
            int side = find(ends);
            int p = mesh.apex(side);
            int q = mesh.apex(mesh.twin(side));
            if (turn(q, ends.to(), p) <= 0 || turn(p, ends.from(), q) <= 0) {
                crossing.add(ends);
                continue;
            }
            flip(side);
            if (Math.signum(turn(from, target, q)) * Math.signum(turn(from, target, p)) < 0) {
                crossing.add(new Ends(q, p));
            } else {
                made.add(new Ends(q, p));
            }
        }
        return made;
    }

    private void restore(List<Ends> made) {
        boolean changed = true;
        while (changed) {
            changed = false;
            for (int i = 0; i < made.size(); i++) {
                int side = find(made.get(i));
                int other = mesh.twin(side);
                int q = mesh.apex(other);
                if (mesh.constraint(side) < 0 && q >= 0 && mesh.apex(side) >= 0 && isInCircle(side, q)) {
                    made.set(i, new Ends(q, mesh.apex(side)));
                    flip(side);
                    changed = true;
                }
            }
        }
    }

    private boolean isInCircle(int side, int q) {
        int a = mesh.apex(side);
        int b = mesh.origin(side);
        int c = mesh.destination(side);
        return predicates.inCircle(
                        mesh.x(a), mesh.y(a), mesh.x(b), mesh.y(b), mesh.x(c), mesh.y(c), mesh.x(q), mesh.y(q))
                > 0;
    }

    private void flip(int side) {
        int other = mesh.twin(side) / 3;
        mesh.flip(side);
        note(side / 3);
        note(other);
    }

    private void note(int triangle) {
        for (int s = 3 * triangle; s < 3 * triangle + 3; s++) {
            if (mesh.apex(s) >= 0) {
                sideAt[mesh.apex(s)] = s;
            }
        }
    }

    private int find(Ends ends) {
        int first = sideAt[ends.from()];
        int side = first;
        do {
            if (mesh.origin(side) == ends.to()) {
                return Triangulation.previous(side);
            }
            side = Triangulation.next(mesh.twin(Triangulation.next(side)));
        } while (side != first);
        throw new IllegalStateException("no side from vertex " + ends.from() + " to vertex " + ends.to());
    }

    private void mark(int side, int code) {
        int other = mesh.twin(side);
        if (mesh.constraint(side) >= 0 && mesh.constraint(side) != code) {
            throw new IllegalArgumentException("segments overlap: number " + code / 2 + " and number "
                    + mesh.constraint(side) / 2 + ", at (" + mesh.x(mesh.origin(side)) + " "
                    + mesh.y(mesh.origin(side)) + ")");
        }
        mesh.constraint[side] = code;
        mesh.constraint[other] = code ^ 1;
    }

    private boolean isAhead(int from, int to, int v) {
        double alongX = (mesh.x(to) - mesh.x(from)) * (mesh.x(v) - mesh.x(from));
        double alongY = (mesh.y(to) - mesh.y(from)) * (mesh.y(v) - mesh.y(from));
        return alongX + alongY > 0;
    }

    private double turn(int a, int b, int c) {
        return predicates.orientation(mesh.x(a), mesh.y(a), mesh.x(b), mesh.y(b), mesh.x(c), mesh.y(c));
    }
}
