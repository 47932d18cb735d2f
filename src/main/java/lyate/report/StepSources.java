package lyate.report;

import java.util.ArrayList;
import java.util.Collection;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.Collectors;
import lyate.acidity.Acidity.Relative;
import lyate.review.Review;
import lyate.review.Transfer;
import lyate.stock.KnownPKa;
import lyate.stock.Medium;

/** Every value a review rests on, with where it comes from. */
final class StepSources {

    /**
     * One value in use.
     *
     * @param what   what it is
     * @param value  the value as written; may be empty
     * @param source citation
     */
    private record Use(String what, String value, String source) {}

    /** Heat of fewer protons than this, mmol, is nobody's concern. */
    private static final double WORTH_A_LINE = 0.001;

    private StepSources() {}

    private static List<Use> of(StepFacts facts) {
        Review review = facts.review();
        List<Use> uses = new ArrayList<>();
        for (List<Transfer> same : alike(review.transfers())) {
            Transfer transfer = same.get(0);
            uses.add(new Use("pKa of " + String.join(", ", same.stream().map(Transfer::donor).toList()) + ", " + transfer.acidity().basis().word(),
                    Words.withSigma(transfer.acidity()) + " in " + Words.medium(transfer.acidity().medium()), transfer.acidity().source()));
            for (Relative relative : transfer.acidity().relatives()) {
                uses.add(new Use("measured relative of " + transfer.donor(),
                        relative.smiles() + ", " + relative.site() + ": " + Words.oneDecimal(relative.pKa()), relative.source()));
            }
        }
        review.step().base().pKas().entrySet().stream().sorted(Comparator.comparing((Map.Entry<Medium, KnownPKa> known) -> known.getKey().id()))
                .forEach(known -> uses.add(new Use("pKa of the conjugate acid of " + review.step().base().name(),
                        Words.withSigma(known.getValue().pKa(), known.getValue().sigma()) + " in " + Words.medium(known.getKey()), known.getValue().source())));
        uses.add(new Use("data of " + review.step().base().name(), review.step().base().stock(), review.step().base().source()));
        uses.add(new Use("data of " + review.step().solvent().name(), "", review.step().solvent().source()));
        facts.gasAndHeat().heat().stream().filter(share -> share.milliMole() > WORTH_A_LINE).forEach(share -> uses.add(new Use("heat of " + share.donor(),
                Words.number(share.kiloJoulePerMole()) + " kJ/mol, " + share.how(), share.source())));
        return uses.stream().distinct().toList();
    }

    /** Donors whose value is one and the same, in order. */
    private static Collection<List<Transfer>> alike(List<Transfer> transfers) {
        return transfers.stream().collect(Collectors.groupingBy(transfer -> List.of(Words.withSigma(transfer.acidity()), transfer.acidity().medium(),
                transfer.acidity().basis(), transfer.acidity().source(), transfer.acidity().relatives()), LinkedHashMap::new, Collectors.toList())).values();
    }

    /** The same, every source once with what was taken from it. */
    static Map<String, List<String>> bySource(StepFacts facts) {
        Map<String, List<String>> sources = new LinkedHashMap<>();
        of(facts).forEach(use -> sources.computeIfAbsent(use.source(), source -> new ArrayList<>())
                .add(use.what() + (use.value().isEmpty() ? "" : ", " + use.value())));
        return sources;
    }
}
