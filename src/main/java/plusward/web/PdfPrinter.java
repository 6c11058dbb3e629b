package plusward.web;

import com.openhtmltopdf.outputdevice.helper.BaseRendererBuilder.FSFontUseCase;
import com.openhtmltopdf.outputdevice.helper.BaseRendererBuilder.FontStyle;
import com.openhtmltopdf.outputdevice.helper.ExternalResourceControlPriority;
import com.openhtmltopdf.pdfboxout.PdfRendererBuilder;
import com.openhtmltopdf.svgsupport.BatikSVGDrawer;
import java.io.ByteArrayInputStream;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.StringReader;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.EnumSet;
import java.util.Locale;
import java.util.Map;
import java.util.concurrent.ConcurrentHashMap;
import javax.xml.XMLConstants;
import javax.xml.parsers.DocumentBuilderFactory;
import javax.xml.parsers.ParserConfigurationException;
import org.springframework.context.ApplicationContext;
import org.springframework.core.io.ClassPathResource;
import org.springframework.stereotype.Component;
import org.thymeleaf.ITemplateEngine;
import org.thymeleaf.context.Context;
import org.thymeleaf.spring6.expression.ThymeleafEvaluationContext;
import org.w3c.dom.Document;
import org.w3c.dom.Element;
import org.xml.sax.InputSource;
import org.xml.sax.SAXException;

/**
 * Prints a template as a tagged PDF with the fonts embedded.
 *
 * <p>The template must come out as well-formed XHTML without a document type, with a language, a title and a description;
 * these become the document's own. An {@code <svg>} needs its alternative text in an attribute {@code alt}, because its
 * letters are printed as outlines. Its look is {@code print/paper.css}. Nothing is fetched from anywhere. Fonts are read
 * at the first print, not at the start.
 */
@Component
public class PdfPrinter {

    private static final String FAMILY = "DejaVu Sans";

    private final ITemplateEngine templates;
    private final ApplicationContext beans;
    private final Map<String, byte[]> files = new ConcurrentHashMap<>();

    PdfPrinter(ITemplateEngine templates, ApplicationContext beans) {
        this.templates = templates;
        this.beans = beans;
    }

    /** The document as bytes. */
    public byte[] print(String template, Map<String, Object> values, Locale language, Paper paper) {
        Context context = new Context(language, values);
        context.setVariable(
                ThymeleafEvaluationContext.THYMELEAF_EVALUATION_CONTEXT_CONTEXT_VARIABLE_NAME,
                new ThymeleafEvaluationContext(beans, null));
        return rendered(styled(parsed(templates.process(template, context)), paper));
    }

    private static Document parsed(String xhtml) {
        try {
            DocumentBuilderFactory factory = DocumentBuilderFactory.newInstance();
            factory.setNamespaceAware(true);
            factory.setFeature(XMLConstants.FEATURE_SECURE_PROCESSING, true);
            factory.setFeature("http://apache.org/xml/features/disallow-doctype-decl", true);
            return factory.newDocumentBuilder().parse(new InputSource(new StringReader(xhtml)));
        } catch (ParserConfigurationException | SAXException | IOException fault) {
            throw new IllegalStateException("the template is not well-formed XHTML", fault);
        }
    }

    private Document styled(Document page, Paper paper) {
        Element style = page.createElementNS("http://www.w3.org/1999/xhtml", "style");
        String rules = new String(file("print/paper.css"), StandardCharsets.UTF_8);
        style.setTextContent("@page { size: " + paper.code() + "; }\n" + rules);
        page.getElementsByTagName("head").item(0).appendChild(style);
        return page;
    }

    private byte[] rendered(Document page) {
        ByteArrayOutputStream out = new ByteArrayOutputStream();
        try (BatikSVGDrawer drawings = new BatikSVGDrawer()) {
            PdfRendererBuilder builder = new PdfRendererBuilder();
            builder.usePdfUaAccessibility(true).withProducer("Plusward").useSVGDrawer(drawings);
            builder.useExternalResourceAccessControl(
                    (address, kind) -> false, ExternalResourceControlPriority.RUN_BEFORE_RESOLVING_URI);
            useFont(builder, "fonts/DejaVuSans.ttf", 400);
            useFont(builder, "fonts/DejaVuSans-Bold.ttf", 700);
            builder.withW3cDocument(page, null).toStream(out).run();
        } catch (IOException fault) {
            throw new UncheckedIOException(fault);
        }
        return out.toByteArray();
    }

    private void useFont(PdfRendererBuilder builder, String path, int weight) {
        builder.useFont(
                () -> new ByteArrayInputStream(file(path)),
                FAMILY,
                weight,
                FontStyle.NORMAL,
                true,
                EnumSet.of(FSFontUseCase.DOCUMENT, FSFontUseCase.SVG));
    }

    private byte[] file(String path) {
        return files.computeIfAbsent(path, each -> {
            try {
                return new ClassPathResource(each).getContentAsByteArray();
            } catch (IOException fault) {
                throw new UncheckedIOException(fault);
            }
        });
    }
}
