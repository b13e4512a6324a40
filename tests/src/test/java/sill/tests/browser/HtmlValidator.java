package sill.tests.browser;

import java.io.StringReader;
import java.util.ArrayList;
import java.util.List;
import nu.validator.validation.SimpleDocumentValidator;
import org.xml.sax.ErrorHandler;
import org.xml.sax.InputSource;
import org.xml.sax.SAXParseException;

/**
 * The Nu HTML validator: what is not valid HTML5 in a page. What it says of CSS is left out: its CSS checker, of 2020, does
 * not know properties such as {@code color-scheme}; a browser judges those.
 */
final class HtmlValidator {
    private static final String SCHEMA = "http://s.validator.nu/html5-all.rnc";

    private HtmlValidator() {}

    /** Errors and warnings, each with its line. */
    static List<String> complaints(String page) throws Exception {
        Complaints complaints = new Complaints();
        SimpleDocumentValidator validator = new SimpleDocumentValidator();
        validator.setUpMainSchema(SCHEMA, complaints);
        validator.setUpValidatorAndParsers(complaints, false, false);
        validator.checkHtmlInputSource(new InputSource(new StringReader(page)));
        return complaints.found;
    }

    private static final class Complaints implements ErrorHandler {
        private final List<String> found = new ArrayList<>();

        @Override
        public void warning(SAXParseException complaint) {
            add("warning", complaint);
        }

        @Override
        public void error(SAXParseException complaint) {
            add("error", complaint);
        }

        @Override
        public void fatalError(SAXParseException complaint) {
            add("fatal", complaint);
        }

        private void add(String kind, SAXParseException complaint) {
            if (complaint.getMessage().startsWith("CSS:")) {
                return;
            }
            found.add(kind + " in line " + complaint.getLineNumber() + ": " + complaint.getMessage());
        }
    }
}
