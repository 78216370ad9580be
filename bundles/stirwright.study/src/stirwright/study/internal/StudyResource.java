package stirwright.study.internal;

import java.util.Map;
import org.eclipse.emf.common.util.URI;
import org.eclipse.emf.ecore.resource.Resource;
import org.eclipse.emf.ecore.xmi.XMLResource;
import org.eclipse.emf.ecore.xmi.impl.XMIResourceImpl;
import org.eclipse.emf.ecore.xmi.impl.XMLInfoImpl;
import org.eclipse.emf.ecore.xmi.impl.XMLMapImpl;
import stirwright.study.StudyPackage;

/**
 * How a study is written as XMI and read again. It belongs to no resource set, so that nothing can be loaded through it.
 */
final class StudyResource extends XMIResourceImpl {
    private static final String FEATURES = "http://xml.org/sax/features/";

    /** A study has no document type; without one there are no entities, of its own or from elsewhere. */
    private static final Map<String, Boolean> PARSER = Map.of(
            "http://apache.org/xml/features/disallow-doctype-decl", true,
            "http://apache.org/xml/features/nonvalidating/load-external-dtd", false,
            FEATURES + "external-general-entities", false,
            FEATURES + "external-parameter-entities", false);

    StudyResource() {
        super(URI.createURI("study:/study"));
        setEncoding("UTF-8");
        XMLMapImpl forms = new XMLMapImpl();
        XMLInfoImpl element = new XMLInfoImpl();
        element.setXMLRepresentation(XMLResource.XMLInfo.ELEMENT);
        forms.add(StudyPackage.eINSTANCE.getStudy_Notes(), element);
        getDefaultSaveOptions().put(XMLResource.OPTION_XML_MAP, forms);
        getDefaultSaveOptions().put(Resource.OPTION_LINE_DELIMITER, "\n");
        getDefaultSaveOptions().put(XMLResource.OPTION_LINE_WIDTH, 120);
        getDefaultLoadOptions().put(XMLResource.OPTION_PARSER_FEATURES, PARSER);
    }
}
