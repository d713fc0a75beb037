package soakline.report;

import java.awt.Dimension;
import java.awt.Graphics2D;
import java.io.IOException;
import java.io.StringWriter;
import java.util.function.Consumer;
import javax.xml.parsers.DocumentBuilderFactory;
import javax.xml.parsers.ParserConfigurationException;
import org.apache.batik.svggen.SVGGeneratorContext;
import org.apache.batik.svggen.SVGGraphics2D;
import org.apache.batik.svggen.SVGIDGenerator;
import org.w3c.dom.Document;
import org.w3c.dom.Element;

/** Draws into SVG, with text as text. The same drawing gives the same characters. */
final class SvgDrawing {

    private SvgDrawing() {}

    /**
     * A drawing as an SVG file without a type declaration, which would name a page on the web that strict readers fetch or,
     * offline, fail on.
     *
     * @param names what the names inside begin with, so that several drawings fit on one page
     */
    static String of(int width, int height, String names, Consumer<Graphics2D> drawing) throws IOException {
        Document document = emptyDrawing();
        SVGGeneratorContext context = SVGGeneratorContext.createDefault(document);
        context.setComment("Soakline");
        context.setIDGenerator(new SVGIDGenerator() {
            @Override
            public String generateID(String prefix) {
                return names + super.generateID(prefix);
            }
        });
        SVGGraphics2D graphics = new SVGGraphics2D(context, false);
        graphics.setSVGCanvasSize(new Dimension(width, height));
        drawing.accept(graphics);
        StringWriter text = new StringWriter();
        Element root = graphics.getRoot();
        // so that a viewer can scale it
        root.setAttribute("viewBox", "0 0 " + width + " " + height);
        graphics.stream(root, text, true, false);
        return withoutDoctype(text.toString());
    }

    private static String withoutDoctype(String svg) {
        int from = svg.indexOf("<!DOCTYPE");
        int to = svg.indexOf('>', from) + 1;
        return from < 0 || to <= from ? svg : svg.substring(0, from) + svg.substring(to);
    }

    private static Document emptyDrawing() {
        try {
            return DocumentBuilderFactory.newDefaultInstance()
                    .newDocumentBuilder()
                    .getDOMImplementation()
                    .createDocument("http://www.w3.org/2000/svg", "svg", null);
        } catch (ParserConfigurationException e) {
            throw new IllegalStateException(e);
        }
    }
}
