package tepor.viewer.export;

import com.fasterxml.jackson.core.JsonEncoding;
import com.fasterxml.jackson.core.JsonFactory;
import com.fasterxml.jackson.core.JsonGenerator;
import com.fasterxml.jackson.core.util.DefaultIndenter;
import com.fasterxml.jackson.core.util.DefaultPrettyPrinter;
import java.io.IOException;
import java.io.OutputStream;

/** Writes JSON whose numbers are finite: what is infinite or not a number becomes null (RFC 8259, 6). */
final class JsonText implements AutoCloseable {
    private static final JsonFactory FACTORY = JsonFactory.builder()
            .configure(com.fasterxml.jackson.core.StreamWriteFeature.AUTO_CLOSE_TARGET, false)
            .build();

    private final JsonGenerator json;

    /** A part of the text; written within an object or an array that is open. */
    @FunctionalInterface
    interface Part {
        void write() throws IOException;
    }

    JsonText(OutputStream out) throws IOException {
        json = FACTORY.createGenerator(out, JsonEncoding.UTF8);
        DefaultIndenter indenter = new DefaultIndenter("  ", "\n");
        json.setPrettyPrinter(new DefaultPrettyPrinter().withObjectIndenter(indenter));
    }

    void object(Part part) throws IOException {
        json.writeStartObject();
        part.write();
        json.writeEndObject();
    }

    void object(String name, Part part) throws IOException {
        json.writeFieldName(name);
        object(part);
    }

    void array(String name, Part part) throws IOException {
        json.writeFieldName(name);
        json.writeStartArray();
        part.write();
        json.writeEndArray();
    }

    void text(String name, String value) throws IOException {
        if (value == null) {
            json.writeNullField(name);
        } else {
            json.writeStringField(name, value);
        }
    }

    void text(String value) throws IOException {
        json.writeString(value);
    }

    void number(String name, double value) throws IOException {
        json.writeFieldName(name);
        number(value);
    }

    void number(double value) throws IOException {
        if (Double.isFinite(value)) {
            json.writeNumber(value);
        } else {
            json.writeNull();
        }
    }

    void whole(String name, long value) throws IOException {
        json.writeNumberField(name, value);
    }

    void truth(String name, boolean value) throws IOException {
        json.writeBooleanField(name, value);
    }

    void nothing(String name) throws IOException {
        json.writeNullField(name);
    }

    /** Ends the text with a line feed; leaves the stream open. */
    @Override
    public void close() throws IOException {
        json.writeRaw('\n');
        json.close();
    }
}
