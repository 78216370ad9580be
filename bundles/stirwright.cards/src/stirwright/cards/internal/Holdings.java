package stirwright.cards.internal;

import java.nio.charset.StandardCharsets;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.Comparator;
import java.util.HexFormat;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import stirwright.conformance.Proof;
import stirwright.core.Catalogue;
import stirwright.core.Entry;
import stirwright.correlation.Correlation;
import stirwright.correlation.Effect;
import stirwright.correlation.Family;
import stirwright.correlation.Quantity;

/** What is installed, as the pages need it: in order, with its proofs and the addresses of its pages. */
public final class Holdings {
    private static final Pattern ID = Pattern.compile("[a-z][a-z0-9]*+(?:\\.[a-z0-9]++(?:-[a-z0-9]++)*+)++");

    /** Of an id in a file's name, which with what stands around it is at most 255 bytes on common file systems. */
    private static final int LONGEST = 120;
    private static final int HASH = 17;

    private final Catalogue catalogue;
    private final Map<String, Proof> proofs = new LinkedHashMap<>();
    private final List<Entry> entries;
    private final List<Family> families;

    public Holdings(Catalogue catalogue, List<Proof> proofs) {
        this.catalogue = catalogue;
        // Of two with one id the catalogue keeps the first; so is it here.
        proofs.forEach(proof -> this.proofs.putIfAbsent(proof.correlation().id(), proof));
        entries = catalogue.entries().stream().sorted(Comparator.comparing((Entry e) -> e.correlation().quantity().title())
                .thenComparing(e -> e.correlation().modifierFor().isPresent())
                .thenComparing(e -> e.correlation().id())).toList();
        families = catalogue.families().stream().sorted(Comparator.comparing(Family::title)).toList();
    }

    /** By quantity, modifiers last. */
    public List<Entry> entries() {
        return entries;
    }

    /** By title. */
    public List<Family> families() {
        return families;
    }

    List<Quantity> quantities() {
        return entries.stream().map(entry -> entry.correlation().quantity()).distinct().toList();
    }

    Optional<Family> family(String id) {
        return catalogue.family(id);
    }

    String originOf(Family family) {
        return catalogue.originOf(family);
    }

    /** Empty when its bundle brought no reference rows, or left while they were read. */
    Optional<Proof> proof(Correlation correlation) {
        return Optional.ofNullable(proofs.get(correlation.id()));
    }

    /** The cards that name a family; those that hold for any are not repeated. */
    List<Entry> madeFor(String familyId) {
        return entries.stream().filter(entry -> entry.correlation().families().contains(familyId)).toList();
    }

    List<Entry> forAny() {
        return entries.stream().filter(entry -> entry.correlation().families().isEmpty()).toList();
    }

    /** Not the bare id: on Windows a file called con.something or nul.something cannot be made. */
    public static String file(Correlation correlation) {
        return file("card-", correlation.id());
    }

    public static String file(Family family) {
        return file("family-", family.id());
    }

    /** Long ids are cut, since no file system takes any length; the hash keeps them apart. */
    private static String file(String kind, String id) {
        String name = id.length() <= LONGEST ? id : id.substring(0, LONGEST - HASH) + '-' + hash(id);
        return kind + name + ".html";
    }

    private static String hash(String id) {
        try {
            byte[] all = MessageDigest.getInstance("SHA-256").digest(id.getBytes(StandardCharsets.UTF_8));
            return HexFormat.of().formatHex(all).substring(0, HASH - 1);
        } catch (NoSuchAlgorithmException impossible) {
            throw new IllegalStateException("every Java has SHA-256", impossible);
        }
    }

    /** What a correlation gives, for instance "flow number, discharge". */
    static String gives(Correlation correlation) {
        return correlation.quantity().title()
                + correlation.modifierFor().map(Effect::title).map(t -> ", factor for " + t).orElse("")
                + correlation.flowKind().map(kind -> ", " + kind.id()).orElse("");
    }

    /** Titles are in lower case so that they stand in a sentence. */
    static String heading(String title) {
        return title.isEmpty() ? title : title.substring(0, 1).toUpperCase(Locale.ROOT) + title.substring(1);
    }

    static String standing(Correlation correlation) {
        return correlation.citation().hasSource() ? correlation.standing().words() : "rule of the trade";
    }

    /** A sentence in which the ids of installed correlations lead to their cards. */
    void linked(Html html, String sentence) {
        Matcher ids = ID.matcher(sentence);
        int done = 0;
        while (ids.find()) {
            Optional<Entry> named = catalogue.entry(ids.group());
            if (named.isPresent()) {
                html.words(sentence.substring(done, ids.start()));
                html.leaf("a", ids.group(), "href", file(named.get().correlation()));
                done = ids.end();
            }
        }
        html.words(sentence.substring(done));
    }
}
