package lyate.report;

/** Moves labels apart along one line by as little as possible (least squares), keeping their order. */
public final class LabelSpread {

    private LabelSpread() {}

    /**
     * Spreads the labels; the total of the squared moves is as small as the order and the room allow.
     *
     * @param wanted  where the middles of the labels would like to be, ascending
     * @param height  room of one label
     * @param low     lowest edge allowed
     * @param high    highest edge allowed; too little room lets the labels overlap evenly
     * @return where they go, same order
     */
    public static double[] spread(double[] wanted, double height, double low, double high) {
        int count = wanted.length;
        if (count == 0) {
            return new double[0];
        }
        double step = Math.min(height, (high - low) / count);
        double[] sum = new double[count];
        int[] size = new int[count];
        int blocks = 0;
        for (int i = 0; i < count; i++) {
            // Shifted by i steps, "no overlap" becomes "not descending": pool neighbours that violate it.
            sum[blocks] = wanted[i] - i * step;
            size[blocks] = 1;
            blocks++;
            while (blocks > 1 && sum[blocks - 2] / size[blocks - 2] > sum[blocks - 1] / size[blocks - 1]) {
                sum[blocks - 2] += sum[blocks - 1];
                size[blocks - 2] += size[blocks - 1];
                blocks--;
            }
        }
        double[] placed = new double[count];
        int i = 0;
        for (int block = 0; block < blocks; block++) {
            double base = Math.max(low + step / 2, Math.min(sum[block] / size[block], high - step / 2 - (count - 1) * step));
            for (int k = 0; k < size[block]; k++, i++) {
                placed[i] = base + i * step;
            }
        }
        return placed;
    }
}
