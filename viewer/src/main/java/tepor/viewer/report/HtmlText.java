package tepor.viewer.report;

import java.io.IOException;
import java.io.OutputStream;
import java.util.List;
import javax.xml.stream.XMLOutputFactory;
import javax.xml.stream.XMLStreamException;
import javax.xml.stream.XMLStreamWriter;

/**
 * Writes HTML that is well-formed XML as well. All text goes through one writer that escapes it, so nothing that a user
 * wrote can become markup.
 */
final class HtmlText {
    private final XMLStreamWriter xml;

    /** A part of the page; written within the element that is open. */
    @FunctionalInterface
    interface Part {
        void write() throws IOException;
    }

    /** One call of the XML writer. */
    @FunctionalInterface
    private interface Call {
        void make() throws XMLStreamException;
    }

    HtmlText(OutputStream out) throws IOException {
        try {
            xml = XMLOutputFactory.newDefaultFactory().createXMLStreamWriter(out, "UTF-8");
        } catch (XMLStreamException e) {
            throw new IOException(e);
        }
    }

    /** The whole page: document type, and the root element around the part. */
    void page(Part part) throws IOException {
        call(() -> {
            xml.writeDTD("<!DOCTYPE html>");
            xml.writeCharacters("\n");
        });
        element("html", List.of("xmlns", "http://www.w3.org/1999/xhtml", "lang", "en"), part);
        call(() -> {
            xml.writeCharacters("\n");
            xml.flush();
        });
    }

    /** An element with attributes, given as name, value, name, value. */
    void element(String name, List<String> attributes, Part part) throws IOException {
        call(() -> xml.writeStartElement(name));
        attributes(attributes);
        part.write();
        call(xml::writeEndElement);
    }

    void element(String name, Part part) throws IOException {
        element(name, List.of(), part);
    }

    /** An element that holds text only. */
    void element(String name, String text) throws IOException {
        element(name, List.of(), () -> text(text));
    }

    /** An element of a class that holds text only. */
    void element(String name, String styleClass, String text) throws IOException {
        element(name, List.of("class", styleClass), () -> text(text));
    }

    /** An element without content, such as {@code img}. */
    void empty(String name, List<String> attributes) throws IOException {
        call(() -> xml.writeEmptyElement(name));
        attributes(attributes);
    }

    void text(String text) throws IOException {
        call(() -> xml.writeCharacters(legal(text)));
    }

    /** A section with a heading, on a line of its own in the source. */
    void section(String heading, Part part) throws IOException {
        text("\n");
        element("section", () -> {
            element("h2", heading);
            part.write();
        });
    }

    /** The head of a table; the columns whose heading begins with {@code #} hold figures. */
    void tableHead(List<String> headings) throws IOException {
        element(
                "thead",
                () -> element("tr", () -> {
                    for (String heading : headings) {
                        boolean figures = heading.startsWith("#");
                        element(
                                "th",
                                figures ? List.of("scope", "col", "class", "figure") : List.of("scope", "col"),
                                () -> text(figures ? heading.substring(1) : heading));
                    }
                }));
    }

    private void attributes(List<String> attributes) throws IOException {
        for (int i = 0; i < attributes.size(); i += 2) {
            String name = attributes.get(i);
            String value = legal(attributes.get(i + 1));
            call(() -> xml.writeAttribute(name, value));
        }
    }

    /** Characters that neither HTML nor XML allow become the replacement character. */
    private static String legal(String text) {
        StringBuilder result = new StringBuilder(text.length());
        text.codePoints()
                .map(c -> c == '\t' || c == '\n' || c == '\r' || (c >= 0x20 && c < 0x7f) || isLegalBeyondAscii(c)
                        ? c
                        : 0xfffd)
                .forEach(result::appendCodePoint);
        return result.toString();
    }

    private static boolean isLegalBeyondAscii(int c) {
        return (c >= 0xa0 && c < 0xd800) || (c >= 0xe000 && c < 0xfffe) || (c >= 0x10000 && c <= 0x10ffff);
    }

    private static void call(Call call) throws IOException {
        try {
            call.make();
        } catch (XMLStreamException e) {
            throw e.getCause() instanceof IOException io ? io : new IOException(e);
        }
    }
}
