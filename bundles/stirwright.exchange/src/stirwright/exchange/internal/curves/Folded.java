package stirwright.exchange.internal.curves;

import java.text.Normalizer;
import java.util.Locale;

/**
 * A text in small letters without accents, anything but letters and digits as single spaces, with the way back to the
 * text that it was made of.
 *
 * @param text with a space at both ends, so that words are found whole
 * @param origins where each character of it stands in {@code of}
 */
record Folded(String of, String text, int[] origins) {

    static Folded of(String text) {
        StringBuilder folded = new StringBuilder(" ");
        int[] origins = new int[4 * text.length() + 3];
        for (int i = 0; i < text.length(); i++) {
            String plain = plain(text.charAt(i));
            for (int j = 0; j < plain.length(); j++) {
                char c = plain.charAt(j);
                if (c != ' ' || folded.charAt(folded.length() - 1) != ' ') {
                    origins[folded.length()] = i;
                    folded.append(c);
                }
            }
        }
        if (folded.charAt(folded.length() - 1) != ' ') {
            origins[folded.length()] = text.length();
            folded.append(' ');
        }
        return new Folded(text, folded.toString(), origins);
    }

    private static String plain(char c) {
        if (c < 0x80) {
            boolean kept = c >= '0' && c <= '9' || c >= 'a' && c <= 'z' || c == '#';
            return kept ? String.valueOf(c) : c >= 'A' && c <= 'Z' ? String.valueOf((char) (c + 32)) : " ";
        }
        if (c == '\u00DF') {
            return "ss";
        }
        // An accent of its own, for instance the dot above a gamma, vanishes; a word does not end there.
        if (Character.getType(c) == Character.NON_SPACING_MARK) {
            return "";
        }
        String bare = Normalizer.normalize(String.valueOf(c), Normalizer.Form.NFD).substring(0, 1).toLowerCase(Locale.ROOT);
        return Character.isLetterOrDigit(bare.charAt(0)) ? bare : " ";
    }

    /**
     * Where these words begin as whole words; -1 when they do not occur.
     *
     * @param words with a space at both ends
     */
    int find(String words) {
        int at = text.indexOf(words);
        return at < 0 ? -1 : at + 1;
    }

    /** What stands before the character at this place, in the original. */
    String before(int at) {
        return of.substring(0, origins[at]);
    }

    /** What stands behind words of this length at this place, in the original. */
    String after(int at, int length) {
        return of.substring(Math.min(of.length(), origins[at + length - 1] + 1));
    }

    /** @param words each with a space at both ends */
    boolean hasAny(Iterable<String> words) {
        for (String word : words) {
            if (text.contains(word)) {
                return true;
            }
        }
        return false;
    }

    /** Without the spaces at its ends. */
    String words() {
        return text.strip();
    }
}
