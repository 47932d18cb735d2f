package lyate.acidity.lfer;

import lyate.acidity.Acidity.Effect;

/** Taft terms: what reaches the site through its own bonds, and through the unsaturated atom it is bound to. */
final class ChainTerms {

    private final Facts facts;
    private final Topology t;
    private final int site;
    private final Terms terms;

    private ChainTerms(Facts facts, int site, Terms terms) {
        this.facts = facts;
        this.t = facts.topology();
        this.site = site;
        this.terms = terms;
    }

    static void add(Facts facts, int site, Terms terms) {
        ChainTerms chain = new ChainTerms(facts, site, terms);
        chain.addBonds();
        AnionTerms.add(facts, site, terms);
    }

    private void addBonds() {
        for (int branch = t.first[site]; branch < t.first[site + 1]; branch++) {
            int child = t.child[branch];
            if (t.order[branch] == Topology.AROMATIC) {
                continue;
            }
            if (t.aromatic[child]) {
                terms.add("site.aryl", Effect.RESONANCE, 1, child, "aromatic ring");
                RingTerms.add(facts, "ring", child, site, terms);
            } else if (t.unsaturated(child)) {
                addHead(branch);
            } else {
                addSaturated(branch);
            }
        }
    }

    private void addSaturated(int branch) {
        int child = t.child[branch];
        Substituent s = facts.constants()[branch];
        terms.add("chain.induction", Effect.INDUCTION, s.induction(), child, s.name());
        if (t.element[child] != 6) {
            terms.add("chain.hetero", Effect.ATOM, 1, child, s.name());
            terms.add("chain.halogen", Effect.ATOM, Elements.halogen(t.element[child]) ? 1 : 0, child, s.name());
            terms.add("chain.hetero.hydrogens", Effect.ATOM, t.hydrogens[child], child, s.name());
            terms.add("chain.hetero.induction", Effect.INDUCTION, s.induction(), child, s.name());
            terms.add("chain.hetero.resonance", Effect.RESONANCE, s.resonance(), child, s.name());
            return;
        }
        for (int next = t.first[child]; next < t.first[child + 1]; next++) {
            int second = t.child[next];
            if (second != site) {
                Substituent beyond = facts.constants()[next];
                // a charge acts through space and is counted once, with the charges
                double induction = ShapeTerms.charged(t, second) ? 0 : beyond.induction();
                terms.add("chain.second.induction", Effect.INDUCTION, induction, second, beyond.name());
                if (t.element[second] == 6 && !t.unsaturated(second)) {
                    terms.add("chain.alpha-branch", Effect.STERICS, 1, second);
                } else if (t.element[second] != 6) {
                    terms.add("chain.second.hetero", Effect.INDUCTION, 1, second, beyond.name());
                } else {
                    terms.add(t.aromatic[second] ? "chain.second.aryl" : "chain.second.pi", Effect.INDUCTION, 1, second, beyond.name());
                    if (t.aromatic[second]) {
                        RingTerms.add(facts, "benzylic-ring", second, child, terms);
                    }
                }
                addThird(child, second);
            }
        }
    }

    private void addThird(int child, int second) {
        for (int next = t.first[second]; next < t.first[second + 1]; next++) {
            int third = t.child[next];
            if (third != child && t.order[next] != Topology.AROMATIC) {
                Substituent beyond = facts.constants()[next];
                terms.add("chain.third.induction", Effect.INDUCTION, beyond.induction(), third, beyond.name());
                if (t.element[third] == 6 && !t.unsaturated(third)) {
                    terms.add("chain.beta-branch", Effect.STERICS, 1, third);
                }
            }
        }
    }

    /** The unsaturated atom next to the site (carbonyl, imine, sulfonyl, alkene): what it carries besides the site. */
    private void addHead(int toHead) {
        int head = t.child[toHead];
        terms.add("head.count", Effect.RESONANCE, 1, head, facts.constants()[toHead].name());
        Substituent own = facts.constants()[toHead];
        terms.add("head.own.induction", Effect.INDUCTION, own.induction(), head, own.name());
        for (int branch = t.first[head]; branch < t.first[head + 1]; branch++) {
            int child = t.child[branch];
            if (child == site) {
                continue;
            }
            Substituent s = facts.constants()[branch];
            if (t.order[branch] == 2) {
                String kind = switch (t.element[child]) {
                    case 8 -> "head.oxo";
                    case 16 -> "head.thioxo";
                    case 7 -> "head.imino";
                    default -> "head.ylidene";
                };
                terms.add(kind, Effect.RESONANCE, 1, child);
                if (t.element[child] == 6 || t.element[child] == 7) {
                    addVinylogous(child, head);
                }
            } else if (t.aromatic[child] && t.order[branch] == 1) {
                terms.add("head.aryl", Effect.RESONANCE, 1, child, "aromatic ring");
                RingTerms.add(facts, "head-ring", child, head, terms);
            } else if (t.order[branch] == 1) {
                String kind = t.element[child] == 6 ? "head.induction" : "head.hetero.induction";
                terms.add(kind, Effect.INDUCTION, s.induction(), child, s.name());
                terms.add("head.resonance", Effect.RESONANCE, s.resonance(), child, s.name());
                terms.add("head.donation", Effect.RESONANCE, s.donation(), child, s.name());
                terms.add("head.acceptance", Effect.RESONANCE, s.acceptance(), child, s.name());
                if (t.element[child] == 6 && !t.unsaturated(child)) {
                    addBeyondHead(child, head);
                } else if (t.element[child] != 6) {
                    terms.add("head.hetero-" + Elements.symbol(t.element[child]), Effect.ATOM, 1, child, s.name());
                }
            }
        }
    }

    private void addBeyondHead(int child, int head) {
        for (int next = t.first[child]; next < t.first[child + 1]; next++) {
            int second = t.child[next];
            if (second != head) {
                Substituent beyond = facts.constants()[next];
                terms.add("head.second.induction", Effect.INDUCTION, beyond.induction(), second, beyond.name());
                if (t.element[second] == 6 && !t.unsaturated(second)) {
                    terms.add("head.alpha-branch", Effect.STERICS, 1, second);
                }
                if (t.aromatic[second]) {
                    RingTerms.add(facts, "head-benzylic-ring", second, child, terms);
                }
                for (int further = t.first[second]; further < t.first[second + 1]; further++) {
                    int third = t.child[further];
                    if (third != child && t.order[further] != Topology.AROMATIC) {
                        Substituent s = facts.constants()[further];
                        terms.add("head.third.induction", Effect.INDUCTION, s.induction(), third, s.name());
                        if (t.aromatic[third] && !t.aromatic[second]) {
                            RingTerms.add(facts, "head-third-ring", third, second, terms);
                        }
                    }
                }
            }
        }
    }

    private void addVinylogous(int end, int head) {
        for (int branch = t.first[end]; branch < t.first[end + 1]; branch++) {
            int child = t.child[branch];
            if (child != head && t.order[branch] == 1) {
                Substituent s = facts.constants()[branch];
                terms.add("vinylogous.induction", Effect.INDUCTION, s.induction(), child, s.name());
                terms.add("vinylogous.resonance", Effect.RESONANCE, s.resonance(), child, s.name());
                terms.add("vinylogous.acceptance", Effect.RESONANCE, s.acceptance(), child, s.name());
            }
        }
    }
}
