package lyate.review;

import java.util.List;
import lyate.flask.TransferThermodynamics;

/** Puts the donors of a step into the rows that users see. */
final class Transfers {

    private final Step step;
    private final ProtonShares shares;

    Transfers(Step step, ProtonShares shares) {
        this.step = step;
        this.shares = shares;
    }

    List<Transfer> of(List<Donor> donors) {
        return donors.stream().map(this::transfer).toList();
    }

    private Transfer transfer(Donor donor) {
        Comparison comparison = donor.comparison();
        double sigma = donor.toTemperature() * comparison.sigmaLogK();
        double kelvin = step.temperatureCelsius() + 273.15;
        return new Transfer(donor.label(), donor.site().equivalent(), comparison.donor(), donor.logK(), sigma,
                TransferThermodynamics.deltaGKiloJoule(donor.logK(), kelvin), shares.percentTaken(donor), comparison.reason());
    }
}
