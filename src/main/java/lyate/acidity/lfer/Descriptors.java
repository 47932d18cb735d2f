package lyate.acidity.lfer;

/** Everything the relationships need to know about one site. */
final class Descriptors {

    private Descriptors() {}

    static Terms of(Facts facts, int site) {
        Terms terms = new Terms();
        if (facts.topology().aromatic[site]) {
            RingTerms.add(facts, "ring", site, -1, terms);
        }
        ChainTerms.add(facts, site, terms);
        AmidineTerms.add(facts, site, terms);
        ShapeTerms.add(facts, site, terms);
        return terms;
    }
}
