package lyate.review;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.EnumMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import lyate.molecule.Molecule;
import lyate.review.SideReactionRule.Agent;
import lyate.review.SideReactionRule.Target;
import lyate.stock.Base;
import lyate.stock.Stockroom;
import lyate.table.TableFolders;

/**
 * What a base or an acid does to a molecule besides moving the wanted proton: the rows of {@code side-reactions.csv}.
 *
 * <p>General rows come first: of all rows of one finding kind that fit an atom, the last one decides. A silent row keeps
 * an earlier one quiet. Immutable; safe to share between threads.
 */
public final class SideReactions {

    private final List<SideReactionRule> rules;

    private SideReactions(List<SideReactionRule> rules) {
        this.rules = List.copyOf(rules);
    }

    /**
     * Loads the rules.
     *
     * @param stockroom shelf whose bases and solvents the rules name
     * @throws lyate.table.TableException for a bad cell, pattern or name
     */
    public static SideReactions load(TableFolders folders, Stockroom stockroom) {
        return new SideReactions(new SideReactionTable(stockroom).read(folders));
    }

    /** What the base of a step does to the substrate and to the partner, most severe first. */
    public List<SideReaction> of(Step step, SideReactionContext context) {
        List<SideReaction> found = new ArrayList<>(decided(step.substrate(), Target.SUBSTRATE,
                new UnderBase(step.substrate(), step, context), context.workingBase(), step));
        step.partner().ifPresent(partner -> found.addAll(decided(partner, Target.PARTNER,
                new UnderBase(partner, step, context), context.workingBase(), step)));
        found.sort(Comparator.comparing((SideReaction reaction) -> reaction.finding().severity()));
        return found;
    }

    /**
     * What an acid does to a molecule, for quench, work-up and salt formation; most severe first.
     *
     * @param acidPKa aqueous pKa of the acid, or the pH of a buffered work-up
     * @param celsius temperature
     */
    public List<Finding> underAcid(Molecule molecule, double acidPKa, double celsius) {
        return byRule(molecule, Target.SUBSTRATE, new UnderAcid(molecule, acidPKa, celsius)).entrySet().stream()
                .filter(entry -> entry.getKey().severity().isPresent())
                .map(entry -> finding(entry.getKey(), entry.getKey().sentence(), entry.getValue(), List.of(), Target.SUBSTRATE))
                .sorted(Comparator.comparing(Finding::severity)).toList();
    }

    List<SideReactionRule> rules() {
        return rules;
    }

    /** The rules that decide, in table order, each with the atoms it was found at. */
    Map<SideReactionRule, List<Integer>> byRule(Molecule molecule, Target target, Fit fit) {
        Map<Integer, Map<FindingKind, SideReactionRule>> deciding = new LinkedHashMap<>();
        for (SideReactionRule rule : rules) {
            boolean possible = rule.target() == target && fit.holds(rule);
            for (int atom = 0; possible && atom < molecule.atomCount(); atom++) {
                if (fit.at(rule, atom)) {
                    deciding.computeIfAbsent(atom, key -> new EnumMap<>(FindingKind.class)).put(rule.kind(), rule);
                }
            }
        }
        Map<SideReactionRule, List<Integer>> atoms = new LinkedHashMap<>();
        deciding.forEach((atom, kinds) -> kinds.values()
                .forEach(rule -> atoms.computeIfAbsent(rule, key -> new ArrayList<>()).add(atom)));
        return atoms;
    }

    /** Whether a rule fits: first what is the same for every atom, then an atom. */
    interface Fit {
        boolean holds(SideReactionRule rule);

        boolean at(SideReactionRule rule, int atom);
    }

    /** What the base of a step does to a molecule. */
    record UnderBase(Molecule molecule, Step step, SideReactionContext context) implements Fit {

        @Override
        public boolean holds(SideReactionRule rule) {
            return rule.agent() == Agent.BASE
                    && rule.base().holdsFor(context.workingBase())
                    && rule.surroundings().holdFor(step.solvent(), step.temperatureCelsius())
                    && enoughBase(rule, step, context);
        }

        @Override
        public boolean at(SideReactionRule rule, int atom) {
            return plainFit(rule, molecule, atom)
                    && reached(rule, atom, context)
                    && rule.unless().stream().noneMatch(condition -> SideReactions.holds(condition, molecule, atom, step, context));
        }
    }

    /** What an acid does to a molecule. */
    private record UnderAcid(Molecule molecule, double acidPKa, double celsius) implements Fit {

        @Override
        public boolean holds(SideReactionRule rule) {
            return rule.agent() == Agent.ACID
                    && acidPKa <= rule.acidPKaAtMost().orElse(Double.POSITIVE_INFINITY)
                    && celsius >= rule.surroundings().from().orElse(Double.NEGATIVE_INFINITY);
        }

        @Override
        public boolean at(SideReactionRule rule, int atom) {
            return plainFit(rule, molecule, atom);
        }
    }

    private static boolean plainFit(SideReactionRule rule, Molecule molecule, int atom) {
        return rule.pattern().matches(molecule, atom)
                && rule.unlessPattern().filter(pattern -> pattern.matches(molecule, atom)).isEmpty();
    }

    private static boolean enoughBase(SideReactionRule rule, Step step, SideReactionContext context) {
        double left = switch (rule.protonsFirst()) {
            case NONE -> step.equivalents();
            case FAST -> context.leftAfterFastProtons(step);
            case ALL -> context.leftAfterAllProtons(step);
            case LASTING -> context.leftAfterLastingProtons(step);
        };
        return left > 0 && left >= rule.baseLeft();
    }

    private static boolean reached(SideReactionRule rule, int atom, SideReactionContext context) {
        if (!rule.logK().limited()) {
            return true;
        }
        Optional<Transfer> transfer = context.from(atom);
        return transfer.isPresent() && rule.logK().contains(transfer.get().logK());
    }

    private static boolean holds(SideReactionRule.Condition condition, Molecule molecule, int atom, Step step,
                                 SideReactionContext context) {
        boolean intended = context.intendedAtom().isPresent()
                && molecule.symmetryClass(context.intendedAtom().getAsInt()) == molecule.symmetryClass(atom);
        return switch (condition) {
            case MATCHING_ALKOXIDE -> MatchingAlkoxide.at(molecule, atom, context.workingBase().conjugateAcid());
            case MATCHING_SOLVENT -> MatchingAlkoxide.at(molecule, atom, step.solvent().smiles());
            case INTENDED_ATOM -> intended;
            case NO_STEREOCENTRE -> !molecule.stereocentres().contains(atom);
        };
    }

    private List<SideReaction> decided(Molecule molecule, Target target, Fit fit, Base base, Step step) {
        List<SideReaction> reactions = new ArrayList<>();
        byRule(molecule, target, fit).forEach((rule, atoms) -> rule.severity().ifPresent(severity -> {
            String sentence = RuleCells.fill(rule.sentence(), base, step.solvent());
            List<String> evidence = List.of("rule " + rule.id(), "at " + labels(molecule, atoms));
            reactions.add(new SideReaction(rule.id(), finding(rule, sentence, atoms, evidence, target), rule.wins()));
        }));
        return reactions;
    }

    private static Finding finding(SideReactionRule rule, String sentence, List<Integer> atoms, List<String> evidence, Target target) {
        return new Finding(rule.severity().orElseThrow(), rule.kind(), sentence, evidence,
                target == Target.SUBSTRATE ? atoms : List.of(), rule.source());
    }

    private static String labels(Molecule molecule, List<Integer> atoms) {
        return String.join(", ", atoms.stream().map(molecule::label).toList());
    }
}
