package stirwright.core.internal;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
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

    /** @param why one sentence for why or why not */
    record Ranked(Trial trial, Role role, String why) {
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
        List<Trial> qualified = trials.stream()
                .filter(t -> t.candidate().correlation().isPresent() && t.usable() && t.assessment().qualifies())
                .toList();
        List<Trial> rest = trials.stream()
                .filter(t -> t.candidate().correlation().isPresent() && !qualified.contains(t))
                .sorted(Ranking.NEAREST_FIRST)
                .toList();
        Optional<Trial> recommended = qualified.stream().findFirst();
        List<Ranked> ranked = new ArrayList<>();
        for (Trial trial : trials) {
            if (isChosen(trial, chosen)) {
                ranked.add(new Ranked(trial, Role.CHOSEN, chosenWords(trial)));
            }
        }
        for (Trial trial : qualified) {
            if (!isChosen(trial, chosen)) {
                boolean best = trial == recommended.get();
                ranked.add(new Ranked(trial, best ? Role.RECOMMENDED : Role.CANDIDATE,
                        best ? recommendedWords(trial, qualified) : behindWords(trial, recommended.get())));
            }
        }
        for (Trial trial : rest) {
            if (!isChosen(trial, chosen)) {
                ranked.add(new Ranked(trial, Role.EXCLUDED, "excluded: " + trial.assessment().obstacle()));
            }
        }
        Optional<Ranked> belongs = ranked.stream()
                .filter(r -> r.role() != Role.CHOSEN && belonging.filter(r.id()::equals).isPresent() && r.trial().usable())
                .findFirst();
        Optional<Ranked> pick = ranked.stream().filter(r -> r.role() == Role.CHOSEN).findFirst()
                .or(() -> belongs)
                .or(() -> ranked.stream().filter(r -> r.trial().usable()).findFirst());
        pick.ifPresent(p -> {
            ranked.remove(p);
            ranked.add(0, p);
        });
        return new Selection(List.copyOf(ranked), pick);
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

    private static String recommendedWords(Trial trial, List<Trial> qualified) {
        String start = "recommended: no stated bound fails";
        return qualified.size() < 2
                ? start + ", and no other candidate qualifies"
                : start + "; ahead of " + qualified.get(1).candidate().id() + ": "
                        + Ranking.difference(correlation(trial), correlation(qualified.get(1)));
    }

    private static String behindWords(Trial trial, Trial recommended) {
        return "qualifies, behind " + recommended.candidate().id() + ": "
                + Ranking.difference(correlation(recommended), correlation(trial));
    }
}
