package stirwright.cards.internal;

import java.util.function.Consumer;

/** The frame of every page. */
public final class Page {
    public static final String STYLE = "cards.css";
    public static final String SCRIPT = "filter.js";
    public static final String INDEX = "index.html";

    /** In the first line of the style and the script; by these words they are known as ours. */
    public static final String MARK = "Stirwright cards";

    /** The same for pages. */
    public static final String GENERATOR = "<meta name=\"generator\" content=\"" + MARK + "\"/>";

    private static final String CAUTION = "Stirwright estimates. Drive, mechanical and safety design is for the responsible"
            + " engineer, by the codes that apply and with the equipment maker.";

    private Page() {}

    static String of(String title, String kind, Consumer<Html> body) {
        Html html = new Html();
        html.open("body").line();
        if (!kind.equals("index")) {
            html.open("nav", "class", "back").leaf("a", "All cards", "href", INDEX).close().line();
        }
        html.open("main", "class", kind).line();
        body.accept(html);
        html.close().line().leaf("footer", CAUTION).line().close();
        return "<!DOCTYPE html>\n<html xmlns=\"http://www.w3.org/1999/xhtml\" lang=\"en\">\n<head>\n<meta charset=\"utf-8\"/>\n"
                + GENERATOR + "\n<meta name=\"viewport\" content=\"width=device-width, initial-scale=1\"/>\n"
                + new Html().leaf("title", title) + "\n" + new Html().single("link", "rel", "stylesheet", "href", STYLE)
                + "\n</head>\n" + html + "\n</html>\n";
    }
}
