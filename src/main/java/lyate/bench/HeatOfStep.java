package lyate.bench;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import lyate.bench.Enthalpies.Donor;
import lyate.bench.Enthalpies.ReactionHeat;
import lyate.flask.Flask;
import lyate.flask.TransferThermodynamics;
import lyate.review.FindingKind;
import lyate.review.Review;
import lyate.review.Step;
import lyate.review.Transfer;
import lyate.stock.Base;
import lyate.stock.Medium;

/**
 * Who gives its protons to the base in a step, and the heat of each. Where a tabulated heat is at hand it is used; for a
 * proton of the substrate the larger of the pKa difference taken as enthalpy and, where the proton is at least as acidic
 * as water, the heat with water: rather too much than too little, and never less than nothing. What a base gives off as
 * its own solvent destroys it is only known where it is tabulated: pKa differences say too little there.
 */
final class HeatOfStep {

    private static final Map<Medium, Double> WATER_PKA = Map.of(Medium.WATER, 15.74, Medium.DMSO, 31.4);
    private static final Map<String, Donor> SOLVENT_DONORS =
            Map.of("water", Donor.WATER, "meoh", Donor.METHANOL, "etoh", Donor.ETHANOL);
    private static final String BY_PKA = "from the pKa difference, taken as enthalpy alone; no calorimetry";
    private static final String BY_WATER = "at least that with water, which is less acidic: ";

    private final Review review;
    private final Enthalpies enthalpies;
    private final List<HeatShare> known = new ArrayList<>();
    private final List<String> unknown = new ArrayList<>();
    private final double offered;
    private double taken;

    private HeatOfStep(Review review, Amounts amounts, Enthalpies enthalpies) {
        this.review = review;
        this.offered = amounts.protonsTakenUp();
        this.enthalpies = enthalpies;
    }

    static HeatOfStep of(Review review, Amounts amounts, Enthalpies enthalpies) {
        HeatOfStep heat = new HeatOfStep(review, amounts, enthalpies);
        if (review.findings().stream().anyMatch(finding -> finding.kind() == FindingKind.LEVELLED)) {
            heat.addSolvent(amounts.protonsTakenUp());
        } else {
            heat.addDonors(amounts);
        }
        return heat;
    }

    /** Donors whose heat is known, in the order they react. */
    List<HeatShare> known() {
        return List.copyOf(known);
    }

    /** Donors whose heat nothing is known about. */
    List<String> unknown() {
        return List.copyOf(unknown);
    }

    /** Protons taken in the step, mmol. */
    double milliMoleTaken() {
        return taken;
    }

    private void addSolvent(double protons) {
        Step step = review.step();
        taken += protons;
        add(step.solvent().name(), protons, Optional.ofNullable(SOLVENT_DONORS.get(step.solvent().id()))
                .flatMap(donor -> enthalpies.of(step.base(), donor)).map(HeatOfStep::share));
    }

    private void addDonors(Amounts amounts) {
        for (Amounts.Spent spent : amounts.spending()) {
            addDonor(spent.what(), spent.milliMole() * fractionTaken(spent.what()), amounts);
        }
        List<String> counted = amounts.spending().stream().map(Amounts.Spent::what).toList();
        for (Transfer transfer : review.transfers()) {
            if (!transfer.atoms().isEmpty() && !counted.contains(transfer.donor())) {
                double protons = amounts.batch().milliMole() * Amounts.protons(review.step(), transfer);
                addDonor(transfer.donor(), protons * transfer.percentTaken() / 100, amounts);
            }
        }
    }

    private void addDonor(String donor, double protons, Amounts amounts) {
        double given = Math.min(amounts.protonsTakenUp() - taken, protons);
        taken += given;
        add(donor, given, donor.equals("water") ? withWater(review.step().base()) : withSite(donor));
    }

    private double fractionTaken(String what) {
        return transfer(what).map(transfer -> transfer.percentTaken() / 100).orElse(1.0);
    }

    private Optional<Transfer> transfer(String donor) {
        return review.transfers().stream().filter(transfer -> transfer.donor().equals(donor)).findFirst();
    }

    private Optional<HeatShare> withWater(Base base) {
        return enthalpies.of(base, Donor.WATER).map(HeatOfStep::share).or(() -> byPKaOfWater(base));
    }

    private Optional<HeatShare> withSite(String site) {
        return transfer(site).map(transfer -> {
            double fromPKa = Math.max(0, -transfer.deltaG());
            Double water = WATER_PKA.get(transfer.acidity().medium());
            Optional<ReactionHeat> floor = enthalpies.of(review.step().base(), Donor.WATER)
                    .filter(heat -> water != null && transfer.acidity().pKa() <= water && -heat.kiloJoulePerProton() > fromPKa);
            return floor.map(heat -> new HeatShare(site, 0, -heat.kiloJoulePerProton(), false, BY_WATER + heat.equation(), heat.source()))
                    .orElse(new HeatShare(site, 0, fromPKa, false, BY_PKA, "proton balance of this step"));
        });
    }

    private static HeatShare share(ReactionHeat heat) {
        return new HeatShare("", 0, -heat.kiloJoulePerProton(), true, heat.equation(), heat.source());
    }

    /** By the medium that says more; empty where none says that water gives its proton readily. */
    private static Optional<HeatShare> byPKaOfWater(Base base) {
        return WATER_PKA.entrySet().stream()
                .flatMap(water -> base.pKa(water.getKey()).map(known -> known.pKa() - water.getValue()).stream())
                .max(Comparator.naturalOrder()).filter(logK -> logK > 0)
                .map(logK -> new HeatShare("", 0, -TransferThermodynamics.deltaGKiloJoule(logK, Flask.ROOM_KELVIN), false, BY_PKA,
                        "pKa values of base and water"));
    }

    private void add(String donor, double milliMole, Optional<HeatShare> heat) {
        // A trace neither adds to the heat nor, where nothing is known about it, hides the heat of the rest.
        if (!Figures.notable(milliMole, offered)) {
            return;
        }
        heat.ifPresentOrElse(share -> known.add(new HeatShare(donor, milliMole, share.kiloJoulePerMole(), share.tabulated(),
                share.how(), share.source())), () -> unknown.add(donor));
    }
}
