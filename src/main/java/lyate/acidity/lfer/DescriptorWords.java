package lyate.acidity.lfer;

import java.util.Map;

/** Says a descriptor in words for a recipe. */
final class DescriptorWords {

    private static final Map<String, String> WORDS = Map.ofEntries(
            Map.entry("ring", "on the ring,"), Map.entry("head-ring", "on the ring of the acyl group,"),
            Map.entry("benzylic-ring", "on the benzylic ring,"), Map.entry("head-benzylic-ring", "on the ring one bond off,"),
            Map.entry("head-third-ring", "on the ring two bonds off,"), Map.entry("chain", "along the chain,"),
            Map.entry("head", "on the unsaturated neighbour,"), Map.entry("vinylogous", "at the far end of the double bond,"),
            Map.entry("anion", "taking up the charge,"), Map.entry("shape", "shape,"), Map.entry("site", "at the site,"),
            Map.entry("hydrogen-bond", "hydrogen bond,"), Map.entry("charge", "charge,"), Map.entry("amidine", "on the nitrogen atoms,"), Map.entry("pairs", "several groups, saturating"),
            Map.entry("far", "further ring (conjugated)"), Map.entry("away", "further ring"), Map.entry("second", "one atom off"),
            Map.entry("third", "two atoms off"), Map.entry("aza", "ring nitrogen"), Map.entry("oxa", "ring oxygen"),
            Map.entry("thia", "ring sulfur"), Map.entry("azole-n", "ring NH or NR"), Map.entry("total", "all groups, saturating"),
            Map.entry("later", "third group"), Map.entry("square", "saturation"), Map.entry("own", "the neighbour itself"),
            Map.entry("oxo", "C=O"), Map.entry("thioxo", "C=S"), Map.entry("imino", "C=N"), Map.entry("ylidene", "C=C"));

    private DescriptorWords() {}

    static String of(Term term) {
        StringBuilder words = new StringBuilder();
        for (String part : term.name().split("\\.")) {
            words.append(words.isEmpty() ? "" : " ").append(WORDS.getOrDefault(part, part.replace('-', ' ')));
        }
        words.append(' ').append(Decimals.two(term.value()));
        return term.note().isEmpty() ? words.toString() : words.append(" (").append(term.note()).append(')').toString();
    }
}
