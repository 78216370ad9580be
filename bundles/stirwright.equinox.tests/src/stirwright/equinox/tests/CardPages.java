package stirwright.equinox.tests;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import javax.xml.parsers.DocumentBuilderFactory;
import javax.xml.parsers.ParserConfigurationException;
import org.w3c.dom.Document;
import org.w3c.dom.Element;
import org.w3c.dom.NodeList;
import org.xml.sax.SAXException;

/** The pages of a folder of cards, read by the JDK's XML parser, which takes nothing that is not well-formed. */
record CardPages(Map<String, Document> pages) {

    static CardPages of(Path folder) throws IOException, SAXException, ParserConfigurationException {
        Map<String, Document> pages = new TreeMap<>();
        try (var files = Files.newDirectoryStream(folder, "*.html")) {
            for (Path file : files) {
                pages.put(file.getFileName().toString(),
                        DocumentBuilderFactory.newInstance().newDocumentBuilder().parse(file.toFile()));
            }
        }
        return new CardPages(pages);
    }

    Document page(String name) {
        if (!pages.containsKey(name)) {
            throw new AssertionError("no page " + name + " among " + pages.keySet());
        }
        return pages.get(name);
    }

    static List<Element> elements(Document page, String tag) {
        NodeList found = page.getElementsByTagName(tag);
        List<Element> elements = new ArrayList<>();
        for (int i = 0; i < found.getLength(); i++) {
            elements.add((Element) found.item(i));
        }
        return elements;
    }

    /** The values of one attribute wherever a page has it, in the order of the page. */
    static List<String> values(Document page, String attribute) {
        return elements(page, "*").stream().filter(e -> e.hasAttribute(attribute)).map(e -> e.getAttribute(attribute)).toList();
    }

    static String words(Document page) {
        return page.getDocumentElement().getTextContent();
    }
}
