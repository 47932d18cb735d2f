package lyate.review;

import java.util.List;

/** One small check; looks at a situation and says what it sees, or nothing. */
interface FindingRule {

    List<Finding> find(Situation situation);
}
