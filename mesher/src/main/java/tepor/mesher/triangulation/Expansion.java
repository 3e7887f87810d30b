package tepor.mesher.triangulation;

/**
 * An exact sum of doubles of falling magnitude that do not overlap; reused as workspace.
 *
 * <p>Source: Shewchuk 1997, <em>Adaptive precision floating-point arithmetic and fast robust geometric predicates</em>,
 * Discrete Comput. Geom. 18:305–363: two-sum, two-product (here by fused multiply-add), scale-expansion and
 * fast-expansion-sum with elimination of zeros. Exact as long as nothing overflows or underflows.
 */
final class Expansion {
    private final double[] term;
    private int size;

    /** @param capacity largest number of terms this one will hold */
    Expansion(int capacity) {
        term = new double[capacity];
    }

    /** Sets this to a − b. */
    void setDifference(double a, double b) {
        double x = a - b;
        double bVirtual = a - x;
        double aVirtual = x + bVirtual;
        double tail = (a - aVirtual) + (bVirtual - b);
        size = 0;
        append(tail);
        append(x);
    }

    /** Sets this to a + b; neither may be this one. */
    void setSum(Expansion a, Expansion b) {
        merge(a.term, a.size, 1, b.term, b.size);
    }

    /** Sets this to a − b; neither may be this one. */
    void setDifference(Expansion a, Expansion b) {
        merge(b.term, b.size, -1, a.term, a.size);
    }

    /**
     * Sets this to a·b; all five must be different objects, except that a may be b.
     *
     * @param scaled workspace of 2·(terms of a)
     * @param partial workspace as large as this one
     */
    void setProduct(Expansion a, Expansion b, Expansion scaled, Expansion partial) {
        size = 0;
        for (int i = 0; i < b.size; i++) {
            scaled.setScaled(a, b.term[i]);
            partial.setSum(this, scaled);
            System.arraycopy(partial.term, 0, term, 0, partial.size);
            size = partial.size;
        }
    }

    /** The largest term, which has the sign of the whole; 0 for nothing. */
    double leading() {
        return size == 0 ? 0 : term[size - 1];
    }

    private void setScaled(Expansion a, double factor) {
        size = 0;
        if (a.size == 0) {
            return;
        }
        double carried = a.term[0] * factor;
        append(Math.fma(a.term[0], factor, -carried));
        for (int i = 1; i < a.size; i++) {
            double product = a.term[i] * factor;
            double productTail = Math.fma(a.term[i], factor, -product);
            double sum = carried + productTail;
            append(sumTail(carried, productTail, sum));
            carried = product + sum;
            append(sum - (carried - product));
        }
        append(carried);
    }

    private void merge(double[] e, int eSize, double eSign, double[] f, int fSize) {
        size = 0;
        int i = 0;
        int j = 0;
        double carried = 0;
        while (i < eSize || j < fSize) {
            boolean takeE = j >= fSize || (i < eSize && Math.abs(e[i]) < Math.abs(f[j]));
            double next = takeE ? eSign * e[i++] : f[j++];
            double sum = carried + next;
            append(sumTail(carried, next, sum));
            carried = sum;
        }
        append(carried);
    }

    private void append(double value) {
        if (value != 0) {
            term[size++] = value;
        }
    }

    private static double sumTail(double a, double b, double sum) {
        double bVirtual = sum - a;
        double aVirtual = sum - bVirtual;
        return (a - aVirtual) + (b - bVirtual);
    }
}
