package lyate.report;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import lyate.review.Review;
import lyate.review.Transfer;
import lyate.stock.Base;
import lyate.stock.KnownPKa;
import lyate.stock.Medium;

/**
 * One entry of the acidity ladder.
 *
 * @param name  words beside the mark
 * @param pKa   height on the axis
 * @param sigma standard uncertainty
 * @param value value as written
 * @param site  present for a site of the substrate
 * @param base  whether it is the working base
 */
record LadderRung(String name, double pKa, double sigma, String value, Optional<LetteredSite> site, boolean base) {

    /** pKa units beyond the base, the intended site and the first to go that are still shown, where the axis does not get too long. */
    private static final double OF_INTEREST = 12;
    private static final double LEAST_OF_INTEREST = 3;
    private static final double LONG_AXIS = 36;
    private static final int LONG_NAME = 15;
    private static final double ROOM_KELVIN = 298.15;

    /** Everything near enough to be of interest, highest pKa first; the anchor is the intended site. */
    static List<LadderRung> of(Review review, List<LetteredSite> sites, LetteredSite anchor) {
        Medium medium = anchor.transfer().acidity().medium();
        // log K is that at the temperature of the step; the axis holds pKa values, which are those of 298.15 K.
        double toRoom = (review.step().temperatureCelsius() + 273.15) / ROOM_KELVIN;
        double basePKa = anchor.transfer().acidity().pKa() + anchor.transfer().logK() * toRoom;
        double sigma = Math.sqrt(Math.max(0, Math.pow(anchor.transfer().sigmaLogK() * toRoom, 2) - Math.pow(anchor.transfer().acidity().sigma(), 2)));
        List<LadderRung> rungs = new ArrayList<>();
        rungs.add(new LadderRung(baseName(review), basePKa, sigma, Words.withSigma(basePKa, sigma), Optional.empty(), true));
        sites.forEach(site -> rungs.add(rung(site.letter() + " " + site.transfer().donor(), site.transfer(), Optional.of(site), medium, basePKa, toRoom)));
        review.transfers().stream().filter(transfer -> transfer.atoms().isEmpty())
                .forEach(transfer -> rungs.add(rung(transfer.donor(), transfer, Optional.empty(), medium, basePKa, toRoom)));
        if (review.transfers().stream().noneMatch(transfer -> transfer.donor().equals("solvent"))) {
            review.step().solvent().donorPKa(medium).ifPresent(known -> rungs.add(solvent(review, known)));
        }
        // The first to go heads the list of transfers.
        double first = rungs.size() > 1 ? rungs.get(1).pKa() : basePKa;
        double low = Math.min(first, Math.min(basePKa, anchor.transfer().acidity().pKa()));
        double high = Math.max(first, Math.max(basePKa, anchor.transfer().acidity().pKa()));
        double air = Math.max(LEAST_OF_INTEREST, Math.min(OF_INTEREST, (LONG_AXIS - (high - low)) / 2));
        return rungs.stream().filter(rung -> rung.pKa() >= low - air && rung.pKa() <= high + air)
                .sorted(Comparator.comparingDouble(LadderRung::pKa).reversed()).toList();
    }

    /** A name too long for the picture gives way to an abbreviation, where the base is the one that was added. */
    private static String baseName(Review review) {
        Base base = review.step().base();
        boolean abbreviate = base.name().length() > LONG_NAME && review.workingBase().equals(base.name());
        return abbreviate ? base.aliases().stream().findFirst().orElse(base.name()) : review.workingBase();
    }

    private static LadderRung solvent(Review review, KnownPKa known) {
        return new LadderRung(review.step().solvent().name(), known.pKa(), known.sigma(), Words.withSigma(known.pKa(), known.sigma()),
                Optional.empty(), false);
    }

    /** A donor judged on another scale stands where its gap to the base is its log K, and says so. */
    private static LadderRung rung(String name, Transfer transfer, Optional<LetteredSite> site, Medium medium, double basePKa, double toRoom) {
        boolean sameScale = transfer.acidity().medium().equals(medium);
        double pKa = sameScale ? transfer.acidity().pKa() : basePKa - transfer.logK() * toRoom;
        String value = Words.withSigma(transfer.acidity()) + (sameScale ? "" : " " + Words.medium(transfer.acidity().medium()));
        return new LadderRung(name, pKa, transfer.acidity().sigma(), value, site, false);
    }

    String ink() {
        return base ? Ink.BASE : site.map(LetteredSite::ink).orElse(Ink.SOLVENT);
    }
}
