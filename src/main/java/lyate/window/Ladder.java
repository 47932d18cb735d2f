package lyate.window;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import lyate.report.Words;
import lyate.review.Step;
import lyate.review.Transfer;
import lyate.stock.Base;
import lyate.stock.Medium;
import lyate.stock.Solvent;

/**
 * What stands on the acidity ladder. Pure function of a review.
 *
 * @param medium  whose pKa axis it is
 * @param rungs   everything on it, ascending pKa
 * @param basePKa level of the working base
 * @param beyond  rungs too far away to be of interest, in words; empty where there are none
 */
record Ladder(Medium medium, List<Rung> rungs, double basePKa, String beyond) {

    /** pKa units beyond the intended site and the base that are still shown. */
    private static final double OF_INTEREST = 12;

    private static final double ROOM_KELVIN = 298.15;
    private static final double ZERO_CELSIUS = 273.15;

    Ladder {
        rungs = List.copyOf(rungs);
    }

    /** @param water the row for water */
    static Optional<Ladder> of(Shown shown, List<Base> compared, Solvent water) {
        Optional<Transfer> anchor = shown.intended().map(SiteTag::transfer).or(() -> shown.review().transfers().stream().findFirst());
        return anchor.map(transfer -> of(shown, compared, water, transfer));
    }

    private static Ladder of(Shown shown, List<Base> compared, Solvent water, Transfer anchor) {
        Medium medium = anchor.acidity().medium();
        // log K is that at the temperature of the step; the axis holds pKa values, which are those of 298.15 K.
        double toRoom = (shown.review().step().temperatureCelsius() + ZERO_CELSIUS) / ROOM_KELVIN;
        double basePKa = anchor.acidity().pKa() + anchor.logK() * toRoom;
        Scale scale = new Scale(medium, basePKa, toRoom);
        List<Rung> all = new ArrayList<>();
        shown.tags().sites().forEach(site -> all.add(rung(Rung.Kind.SITE, site.label(), site.transfer(), Optional.of(site), scale)));
        shown.review().transfers().stream().filter(transfer -> transfer.atoms().isEmpty())
                .forEach(transfer -> all.add(other(shown, transfer, scale)));
        Step step = shown.review().step();
        donor(Rung.Kind.SOLVENT, step.solvent(), medium, all).ifPresent(all::add);
        if (step.waterPpm() > 0 && !step.solvent().id().equals(water.id())) {
            donor(Rung.Kind.WATER, water, medium, all).ifPresent(all::add);
        }
        double sigma = Math.sqrt(Math.max(0, square(anchor.sigmaLogK() * toRoom) - square(anchor.acidity().sigma())));
        all.add(new Rung(Rung.Kind.BASE, workingBase(shown), basePKa, sigma, Words.oneDecimal(basePKa), Optional.empty(),
                Optional.empty(), anchor.decidedBy()));
        compared.forEach(base -> base.pKa(medium).ifPresent(known -> all.add(new Rung(Rung.Kind.COMPARED, StockWords.shortName(base), known.pKa(), known.sigma(),
                Words.oneDecimal(known.pKa()), Optional.empty(), Optional.of(base), known.source()))));
        double low = Math.min(basePKa, anchor.acidity().pKa()) - OF_INTEREST;
        double high = Math.max(basePKa, anchor.acidity().pKa()) + OF_INTEREST;
        List<Rung> near = all.stream().filter(rung -> rung.pKa() >= low && rung.pKa() <= high || rung.kind() == Rung.Kind.COMPARED)
                .sorted(Comparator.comparingDouble(Rung::pKa)).toList();
        return new Ladder(medium, near, basePKa, beyond(all, near, low, high));
    }

    /** The abbreviation where the base in the flask is the one that was chosen. */
    private static String workingBase(Shown shown) {
        Base base = shown.review().step().base();
        if (shown.review().baseDestroyed()) {
            return StockWords.shortName(base) + " (gone)";
        }
        return shown.review().workingBase().equals(base.name()) ? StockWords.shortName(base) : shown.review().workingBase();
    }

    /** A solvent by its own pKa, unless the review has a transfer for it already. */
    private static Optional<Rung> donor(Rung.Kind kind, Solvent solvent, Medium medium, List<Rung> already) {
        if (already.stream().anyMatch(rung -> rung.kind() == kind)) {
            return Optional.empty();
        }
        return solvent.donorPKa(medium).map(known -> new Rung(kind, StockWords.shortName(solvent), known.pKa(), known.sigma(),
                Words.withSigma(known.pKa(), known.sigma()), Optional.empty(), Optional.empty(), known.source()));
    }

    private static Rung other(Shown shown, Transfer transfer, Scale scale) {
        return switch (transfer.donor()) {
            case "solvent" -> rung(Rung.Kind.SOLVENT, StockWords.shortName(shown.review().step().solvent()), transfer, Optional.empty(), scale);
            case "water" -> rung(Rung.Kind.WATER, "water", transfer, Optional.empty(), scale);
            default -> rung(Rung.Kind.PARTNER, transfer.donor(), transfer, Optional.empty(), scale);
        };
    }

    /** A donor judged on another scale stands where its gap to the base is its log K, and says so. */
    private static Rung rung(Rung.Kind kind, String name, Transfer transfer, Optional<SiteTag> site, Scale scale) {
        boolean sameScale = transfer.acidity().medium().equals(scale.medium());
        double pKa = sameScale ? transfer.acidity().pKa() : scale.basePKa() - transfer.logK() * scale.toRoom();
        String text = Words.withSigma(transfer.acidity()) + (sameScale ? "" : " " + Words.medium(transfer.acidity().medium()));
        return new Rung(kind, name, pKa, transfer.acidity().sigma(), text, site, Optional.empty(), transfer.decidedBy());
    }

    private static String beyond(List<Rung> all, List<Rung> near, double low, double high) {
        long above = all.stream().filter(rung -> !near.contains(rung) && rung.pKa() > high).count();
        long below = all.stream().filter(rung -> !near.contains(rung) && rung.pKa() < low).count();
        List<String> words = new ArrayList<>();
        if (above > 0) {
            words.add(String.format(Locale.ROOT, "%d more above %.0f", above, high));
        }
        if (below > 0) {
            words.add(String.format(Locale.ROOT, "%d more below %.0f", below, low));
        }
        return String.join(", ", words);
    }

    /** The axis, the base on it, and the factor from log K at the step's temperature to pKa units at room temperature. */
    private record Scale(Medium medium, double basePKa, double toRoom) {}

    Optional<Rung> intended() {
        return rungs.stream().filter(Rung::intended).findFirst();
    }

    /** Lowest value the axis must show. */
    double low() {
        return rungs.stream().mapToDouble(rung -> rung.pKa() - rung.sigma()).min().orElse(0);
    }

    /** Highest value the axis must show. */
    double high() {
        return rungs.stream().mapToDouble(rung -> rung.pKa() + rung.sigma()).max().orElse(14);
    }

    private static double square(double value) {
        return value * value;
    }
}
