package lyate.fit;

import lyate.acidity.lfer.SiteDescription;
import lyate.stock.Medium;

/**
 * A measured value of a known site.
 *
 * @param place    file and line, for messages
 * @param smiles   the molecule as written
 * @param label    label of the site
 * @param compound equal for equal constitutions: folds keep a compound together
 * @param kind     rough class beside the value in the file, for the report
 * @param named    whether the file names the site; else {@link SiteAssignment} found it
 * @param medium   the medium
 * @param site     description of the site
 * @param pKa      the value, statistical factors included
 * @param noise    its standard uncertainty as a multiple of a reliable one's
 */
record TrainingRow(String place, String smiles, String label, String compound, String kind, boolean named, Medium medium,
                   SiteDescription site, double pKa, double noise) {

    /** The value of one of the equivalent places. */
    double intrinsic() {
        return pKa - site.statistics();
    }

    /** Whether the value makes chemical sense for the series it is named for. */
    boolean plausible() {
        return !medium.equals(Medium.WATER) || pKa >= site.series().lowest() && pKa <= site.series().highest();
    }
}
