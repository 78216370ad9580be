package stirwright.study.internal;

import java.io.ByteArrayInputStream;
import java.util.ArrayDeque;
import java.util.Deque;
import java.util.HashSet;
import java.util.Set;
import javax.xml.stream.XMLInputFactory;
import javax.xml.stream.XMLStreamConstants;
import javax.xml.stream.XMLStreamException;
import javax.xml.stream.XMLStreamReader;
import org.eclipse.emf.ecore.EAttribute;
import org.eclipse.emf.ecore.EClass;
import org.eclipse.emf.ecore.EReference;
import org.eclipse.emf.ecore.EStructuralFeature;
import stirwright.study.StudyPackage;

/** Refuses what EMF reads past without a word: of two values it takes one, and it drops extensions and stray text. */
final class OneOfEach {
    private static final String XMI = "http://www.omg.org/XMI";

    private final XMLStreamReader xml;
    private final Deque<Element> open = new ArrayDeque<>();

    /** @param type null for one that holds the value of an attribute, or names a part */
    private record Element(String name, EClass type, boolean mayHoldText, Set<EStructuralFeature> given) {}

    private OneOfEach(XMLStreamReader xml) {
        this.xml = xml;
    }

    /** @param bytes of a file that EMF has read as a study */
    static void require(byte[] bytes) throws NoStudyException {
        XMLInputFactory factory = XMLInputFactory.newDefaultFactory();
        factory.setProperty(XMLInputFactory.SUPPORT_DTD, false);
        factory.setProperty(XMLInputFactory.IS_SUPPORTING_EXTERNAL_ENTITIES, false);
        try {
            new OneOfEach(factory.createXMLStreamReader(new ByteArrayInputStream(bytes))).read();
        } catch (XMLStreamException damaged) {
            throw new NoStudyException("is a damaged study; take a copy of it", damaged);
        }
    }

    private void read() throws XMLStreamException, NoStudyException {
        while (xml.hasNext()) {
            switch (xml.next()) {
                case XMLStreamConstants.START_ELEMENT -> begin();
                case XMLStreamConstants.END_ELEMENT -> open.pop();
                case XMLStreamConstants.CHARACTERS, XMLStreamConstants.CDATA -> text();
                default -> { }
            }
        }
    }

    private void begin() throws NoStudyException {
        String name = xml.getLocalName();
        if (open.isEmpty()) {
            boolean study = !XMI.equals(xml.getNamespaceURI());
            open.push(new Element(name, study ? StudyPackage.Literals.STUDY : null, false, new HashSet<>()));
        } else if (XMI.equals(xml.getNamespaceURI())) {
            throw refused("has the extension '" + xml.getPrefix() + ":" + name + "', which would be lost; delete it");
        } else if (open.peek().type() == null) {
            open.push(new Element(name, open.size() == 1 ? StudyPackage.Literals.STUDY : null, false, new HashSet<>()));
        } else {
            EStructuralFeature feature = open.peek().type().getEStructuralFeature(name);
            take(feature);
            EClass type = feature instanceof EReference part && part.isContainment() ? part.getEReferenceType() : null;
            open.push(new Element(name, type, feature instanceof EAttribute, new HashSet<>()));
        }
        attributes();
    }

    private void attributes() throws NoStudyException {
        EClass type = open.peek().type();
        for (int i = 0; type != null && i < xml.getAttributeCount(); i++) {
            EStructuralFeature feature = xml.getAttributeNamespace(i) == null || xml.getAttributeNamespace(i).isEmpty()
                    ? type.getEStructuralFeature(xml.getAttributeLocalName(i)) : null;
            take(feature);
            if (feature instanceof EReference reference && !reference.isMany()
                    && xml.getAttributeValue(i).strip().contains(" ")) {
                throw refused("has " + Places.quote(xml.getAttributeValue(i)) + " as " + feature.getName()
                        + ", where there can be one; name one");
            }
        }
    }

    private void take(EStructuralFeature feature) throws NoStudyException {
        if (feature != null && !feature.isMany() && !open.peek().given().add(feature)) {
            throw refused("has a second value for " + feature.getName() + ", where there can be one; delete one of them");
        }
    }

    private void text() throws NoStudyException {
        if (!xml.isWhiteSpace() && !open.peek().mayHoldText()) {
            throw refused("has the text " + Places.quote(xml.getText().strip().replaceAll("\\s+", " ")) + " in "
                    + Places.quote(open.peek().name()) + ", which would be lost; delete it, or write it into the notes");
        }
    }

    private NoStudyException refused(String words) {
        return new NoStudyException("line " + xml.getLocation().getLineNumber() + " " + words);
    }
}
