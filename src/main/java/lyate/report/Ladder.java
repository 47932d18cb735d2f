package lyate.report;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.stream.Stream;
import lyate.review.Review;
import lyate.review.Transfer;
import lyate.stock.Base;
import lyate.stock.Medium;
import lyate.stock.Solvent;

/**
 * What stands on the acidity ladder, in reports and in the window. Pure function of a review.
 *
 * @param medium  whose pKa axis it is
 * @param rungs   everything on it, ascending pKa
 * @param basePKa level of the working base
 * @param beyond  rungs too far away to be of interest, in words; empty where there are none
 */
public record Ladder(Medium medium, List<Rung> rungs, double basePKa, String beyond) {

    /** pKa units beyond base, intended site and first to go that are still shown, where the axis does not get too long. */
    private static final double OF_INTEREST = 12;
    private static final double LEAST_OF_INTEREST = 3;
    private static final double LONG_AXIS = 36;
    private static final double ROOM_KELVIN = 298.15;
    private static final double ZERO_CELSIUS = 273.15;

    public Ladder {
        rungs = List.copyOf(rungs);
    }

    /**
     * The ladder in the medium that decides at the intended site; empty where the review has no transfer.
     *
     * @param sites    the sites of the substrate
     * @param compared further bases, shown where the medium has a value for them
     * @param water    the row for water, to be shown where the solvent is not dry
     */
    public static Optional<Ladder> of(Review review, List<LetteredSite> sites, List<Base> compared, Optional<Solvent> water) {
        Optional<Transfer> anchor = sites.stream().filter(LetteredSite::intended).map(LetteredSite::transfer).findFirst()
                .or(() -> review.transfers().stream().findFirst());
        return anchor.map(transfer -> of(review, sites, compared, water, transfer));
    }

    private static Ladder of(Review review, List<LetteredSite> sites, List<Base> compared, Optional<Solvent> water, Transfer anchor) {
        Medium medium = anchor.acidity().medium();
        // log K is that at the temperature of the step; the axis holds pKa values, which are those of 298.15 K.
        double toRoom = (review.step().temperatureCelsius() + ZERO_CELSIUS) / ROOM_KELVIN;
        double basePKa = anchor.acidity().pKa() + anchor.logK() * toRoom;
        Scale scale = new Scale(medium, basePKa, toRoom);
        List<Rung> all = new ArrayList<>();
        sites.forEach(site -> all.add(rung(Rung.Kind.SITE, site.label(), site.transfer(), Optional.of(site), scale)));
        double first = all.isEmpty() ? basePKa : all.get(0).pKa();
        review.transfers().stream().filter(transfer -> transfer.atoms().isEmpty()).forEach(transfer -> all.add(other(review, transfer, scale)));
        Solvent solvent = review.step().solvent();
        donor(Rung.Kind.SOLVENT, solvent, medium, all).ifPresent(all::add);
        if (review.step().waterPpm() > 0) {
            water.filter(row -> !row.id().equals(solvent.id())).flatMap(row -> donor(Rung.Kind.WATER, row, medium, all)).ifPresent(all::add);
        }
        double sigma = Math.sqrt(Math.max(0, square(anchor.sigmaLogK() * toRoom) - square(anchor.acidity().sigma())));
        all.add(new Rung(Rung.Kind.BASE, workingBase(review), basePKa, sigma, Words.withSigma(basePKa, sigma), Optional.empty(),
                Optional.empty(), anchor.decidedBy()));
        compared.forEach(base -> base.pKa(medium).ifPresent(known -> all.add(new Rung(Rung.Kind.COMPARED, base.shortName(), known.pKa(),
                known.sigma(), Words.withSigma(known.pKa(), known.sigma()), Optional.empty(), Optional.of(base), known.source()))));
        return shortened(medium, basePKa, all, List.of(first, basePKa, anchor.acidity().pKa()));
    }

    /** Without what is far from the levels that matter. */
    private static Ladder shortened(Medium medium, double basePKa, List<Rung> all, List<Double> matter) {
        double lowest = matter.stream().mapToDouble(Double::doubleValue).min().orElse(basePKa);
        double highest = matter.stream().mapToDouble(Double::doubleValue).max().orElse(basePKa);
        double air = Math.max(LEAST_OF_INTEREST, Math.min(OF_INTEREST, (LONG_AXIS - (highest - lowest)) / 2));
        double low = lowest - air;
        double high = highest + air;
        List<Rung> near = all.stream().filter(rung -> rung.pKa() >= low && rung.pKa() <= high || rung.kind() == Rung.Kind.COMPARED)
                .sorted(Comparator.comparingDouble(Rung::pKa)).toList();
        long above = all.stream().filter(rung -> !near.contains(rung) && rung.pKa() > high).count();
        long below = all.size() - near.size() - above;
        String beyond = String.join(", ", Stream.of(above > 0 ? String.format(Locale.ROOT, "%d more above %.0f", above, high) : "",
                below > 0 ? String.format(Locale.ROOT, "%d more below %.0f", below, low) : "").filter(words -> !words.isEmpty()).toList());
        return new Ladder(medium, near, basePKa, beyond);
    }

    /** The abbreviation where the base in the flask is the one that was chosen. */
    private static String workingBase(Review review) {
        Base base = review.step().base();
        if (review.baseDestroyed()) {
            return base.shortName() + " (gone)";
        }
        return review.workingBase().equals(base.name()) ? base.shortName() : review.workingBase();
    }

    /** A solvent by its own pKa, unless the review has a transfer for it already. */
    private static Optional<Rung> donor(Rung.Kind kind, Solvent solvent, Medium medium, List<Rung> already) {
        if (already.stream().anyMatch(rung -> rung.kind() == kind)) {
            return Optional.empty();
        }
        return solvent.donorPKa(medium).map(known -> new Rung(kind, solvent.shortName(), known.pKa(), known.sigma(),
                Words.withSigma(known.pKa(), known.sigma()), Optional.empty(), Optional.empty(), known.source()));
    }

    private static Rung other(Review review, Transfer transfer, Scale scale) {
        return switch (transfer.donor()) {
            case "solvent" -> rung(Rung.Kind.SOLVENT, review.step().solvent().shortName(), transfer, Optional.empty(), scale);
            case "water" -> rung(Rung.Kind.WATER, "water", transfer, Optional.empty(), scale);
            default -> rung(Rung.Kind.PARTNER, transfer.donor(), transfer, Optional.empty(), scale);
        };
    }

    /** A donor judged on another scale stands where its gap to the base is its log K, and says so. */
    private static Rung rung(Rung.Kind kind, String name, Transfer transfer, Optional<LetteredSite> site, Scale scale) {
        boolean sameScale = transfer.acidity().medium().equals(scale.medium());
        double pKa = sameScale ? transfer.acidity().pKa() : scale.basePKa() - transfer.logK() * scale.toRoom();
        String text = Words.withSigma(transfer.acidity()) + (sameScale ? "" : " " + Words.medium(transfer.acidity().medium()));
        return new Rung(kind, name, pKa, transfer.acidity().sigma(), text, site, Optional.empty(), transfer.decidedBy());
    }

    /** The axis, the base on it, and the factor from log K at the step's temperature to pKa units at room temperature. */
    private record Scale(Medium medium, double basePKa, double toRoom) {}

    /** The site that is meant, where it is near enough to be shown. */
    public Optional<Rung> intended() {
        return rungs.stream().filter(Rung::intended).findFirst();
    }

    /** Lowest value the axis must show. */
    public double low() {
        return rungs.stream().mapToDouble(rung -> rung.pKa() - rung.sigma()).min().orElse(0);
    }

    /** Highest value the axis must show. */
    public double high() {
        return rungs.stream().mapToDouble(rung -> rung.pKa() + rung.sigma()).max().orElse(14);
    }

    private static double square(double value) {
        return value * value;
    }
}
