package lyate.review;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import lyate.flask.TransferThermodynamics;
import lyate.review.VerdictRule.World;

/** Puts what is known about a step into the words and numbers of a {@link Review}. */
final class ReviewWriter {

    private final Situation situation;
    private final World world;
    private final Map<Verdict, Double> probabilities;

    ReviewWriter(Situation situation, World world, Map<Verdict, Double> probabilities) {
        this.situation = situation;
        this.world = world;
        this.probabilities = probabilities;
    }

    Review write(List<Finding> findings) {
        Donor intended = situation.intended();
        double probability = probabilities.getOrDefault(situation.verdict(),
                probabilities.values().stream().mapToDouble(Double::doubleValue).max().orElse(0));
        return new Review(situation.step(), situation.verdict(), probability, probabilities, intended.label(), firstSite(),
                situation.workingBase().name(), intended.logK(), situation.shares().percentTaken(intended),
                highestOther(), transfers(), findings, explanation(), List.of());
    }

    private String firstSite() {
        if (situation.verdict() == Verdict.LEVELLED) {
            return "solvent";
        }
        Donor first = situation.donors().get(0);
        return situation.verdict() == Verdict.TOO_WEAK || first.effectiveLogK() <= VerdictRule.NONE ? "none" : first.label();
    }

    private double highestOther() {
        return situation.donors().stream().filter(donor -> donor != situation.intended())
                .mapToDouble(situation.shares()::percentTaken).max().orElse(0);
    }

    private List<Transfer> transfers() {
        return situation.donors().stream().map(this::transfer).toList();
    }

    private Transfer transfer(Donor donor) {
        Comparison comparison = donor.comparison();
        double sigma = donor.toTemperature() * Math.hypot(comparison.donor().sigma(), comparison.acceptor().sigma());
        double kelvin = situation.step().temperatureCelsius() + 273.15;
        return new Transfer(donor.label(), donor.site().equivalent(), comparison.donor(), donor.logK(), sigma,
                TransferThermodynamics.deltaGKiloJoule(donor.logK(), kelvin), situation.shares().percentTaken(donor), comparison.reason());
    }

    private List<String> explanation() {
        List<String> lines = new ArrayList<>();
        Donor intended = situation.intended();
        lines.add(String.format(Locale.ROOT, "%s: pKa %.1f ± %.1f against %.1f ± %.1f for %s, log K = %.1f (%s)", intended.label(),
                intended.comparison().donor().pKa(), intended.comparison().donor().sigma(),
                intended.comparison().acceptor().pKa(), intended.comparison().acceptor().sigma(),
                situation.workingBase().name(), intended.logK(), intended.comparison().reason()));
        VerdictMargin.sentence(world, intended.label()).ifPresent(lines::add);
        return lines;
    }
}
