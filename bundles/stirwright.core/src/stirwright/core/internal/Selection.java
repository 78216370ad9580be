package stirwright.core.internal;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.Supplier;
import stirwright.core.Role;
import stirwright.correlation.Correlation;

/**
 * The candidates for one quantity with their roles and reasons, the pick first.
 *
 * @param ranked all of them
 * @param pick the one that is used: chosen, else recommended, else the nearest; empty when no
 *     candidate has a usable number
 */
record Selection(List<Ranked> ranked, Optional<Ranked> pick) {

    static final Selection NONE = new Selection(List.of(), Optional.empty());

    /** @param words one sentence for why or why not, found when it is asked for */
    record Ranked(Trial trial, Role role, Supplier<String> words) {
        String why() {
            return words.get();
        }

        String id() {
            return trial.candidate().id();
        }

        /** Whether it may be used without a word of doubt. */
        boolean sound() {
            return trial.assessment().qualifies();
        }
    }

    /**
     * @param trials the most recommendable first
     * @param chosen id that the user asked for
     * @param belonging id that the source of another correlation used with it; used before the
     *     recommended one
     */
    static Selection of(List<Trial> trials, Optional<String> chosen, Optional<String> belonging) {
        List<Trial> qualified = trials.stream().filter(Trial::qualifies).toList();
        List<Trial> rest = new ArrayList<>();
        List<Ranked> ranked = new ArrayList<>();
        for (Trial trial : trials) {
            if (isChosen(trial, chosen)) {
                ranked.add(new Ranked(trial, Role.CHOSEN, () -> chosenWords(trial)));
            } else if (!trial.qualifies()) {
                rest.add(trial);
            }
        }
        for (Trial trial : qualified) {
            if (!isChosen(trial, chosen)) {
                boolean best = trial == qualified.get(0);
                ranked.add(new Ranked(trial, best ? Role.RECOMMENDED : Role.CANDIDATE,
                        () -> best ? recommendedWords(qualified) : behindWords(trial, qualified.get(0))));
            }
        }
        rest.sort(Ranking.NEAREST_FIRST);
        for (Trial trial : rest) {
            ranked.add(new Ranked(trial, Role.EXCLUDED, () -> "excluded: " + trial.assessment().obstacle()));
        }
        int pick = pick(ranked, belonging);
        if (pick > 0) {
            ranked.add(0, ranked.remove(pick));
        }
        return new Selection(List.copyOf(ranked), pick < 0 ? Optional.empty() : Optional.of(ranked.get(0)));
    }

    /** The place of the pick in the order chosen, recommended, ..., nearest; -1 when no number is usable. */
    private static int pick(List<Ranked> ranked, Optional<String> belonging) {
        if (!ranked.isEmpty() && ranked.get(0).role() == Role.CHOSEN) {
            return 0;
        }
        int first = -1;
        for (int i = 0; i < ranked.size(); i++) {
            if (ranked.get(i).trial().usable()) {
                if (belonging.filter(ranked.get(i).id()::equals).isPresent()) {
                    return i;
                }
                first = first < 0 ? i : first;
            }
        }
        return first;
    }

    private static boolean isChosen(Trial trial, Optional<String> chosen) {
        return trial.candidate().correlation().isEmpty() || chosen.filter(trial.candidate().id()::equals).isPresent();
    }

    private static Correlation correlation(Trial trial) {
        return trial.candidate().correlation().orElseThrow();
    }

    private static String chosenWords(Trial trial) {
        if (trial.candidate().correlation().isEmpty()) {
            return "chosen: the case gives the value";
        }
        String obstacle = trial.assessment().obstacle();
        return "chosen in the case" + (obstacle.isEmpty() ? "; it qualifies" : " although " + obstacle);
    }

    private static String recommendedWords(List<Trial> qualified) {
        String start = "recommended: no stated bound fails";
        return qualified.size() < 2
                ? start + ", and no other candidate qualifies"
                : start + "; ahead of " + qualified.get(1).candidate().id() + ": "
                        + Ranking.difference(correlation(qualified.get(0)), correlation(qualified.get(1)));
    }

    private static String behindWords(Trial trial, Trial recommended) {
        return "qualifies, behind " + recommended.candidate().id() + ": "
                + Ranking.difference(correlation(recommended), correlation(trial));
    }
}
