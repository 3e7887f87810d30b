package tepor.mesher.dxf;

import java.nio.ByteBuffer;
import java.nio.charset.CharacterCodingException;
import java.nio.charset.Charset;
import java.nio.charset.StandardCharsets;
import java.util.Locale;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * Finds out in which code page a DXF file is, and what its escapes mean. From release 2007 (AC1021) on files are UTF-8,
 * earlier ones are in the code page that {@code $DWGCODEPAGE} names.
 */
final class DxfDecoder {
    private static final String FIRST_UTF8 = "AC1021";
    private static final int HEAD = 65_536;

    private static final Pattern VERSION = variable("ACADVER", 1);
    private static final Pattern CODE_PAGE = variable("DWGCODEPAGE", 3);
    private static final Pattern ESCAPE = Pattern.compile("\\\\[Uu]\\+([0-9A-Fa-f]{4})|%%([cdpCDP%]|[0-9]{3})");

    /** That of UTF-8, read as bytes. */
    private static final String BYTE_ORDER_MARK = "\u00EF\u00BB\u00BF";

    private DxfDecoder() {}

    private static Pattern variable(String name, int code) {
        return Pattern.compile("\\$" + name + "[ \\t]*\\R[ \\t]*" + code + "[ \\t]*\\R[ \\t]*([^\\r\\n]*)");
    }

    /** The file as text; empty, with an error, where it is not text. */
    static Optional<String> decode(byte[] bytes, DxfFaults faults) {
        String head = new String(bytes, 0, Math.min(bytes.length, HEAD), StandardCharsets.ISO_8859_1);
        if (head.startsWith("AutoCAD Binary DXF")) {
            faults.error("binary-dxf", 1, "this is a binary DXF file", "save the drawing as DXF in text form (ASCII)");
            return Optional.empty();
        }
        if (head.startsWith("AC10") || head.startsWith("AC1.") || head.startsWith("AC2.")) {
            faults.error("dwg", 1, "this is a DWG file, named .dxf", "save the drawing as DXF in text form (ASCII)");
            return Optional.empty();
        }
        Charset wide = head.startsWith("\u00FF\u00FE")
                ? StandardCharsets.UTF_16LE
                : head.startsWith("\u00FE\u00FF") ? StandardCharsets.UTF_16BE : null;
        String text = wide != null ? new String(bytes, wide) : decode(bytes, head, faults);
        int nul = text.indexOf('\0');
        if (nul >= 0) {
            int line = (int) text.substring(0, nul).lines().count();
            faults.error(
                    "not-text",
                    Math.max(1, line),
                    "there is a NUL character in the file: it is not DXF in text form",
                    "save the drawing as DXF in text form (ASCII)");
            return Optional.empty();
        }
        return Optional.of(text.startsWith("\uFEFF") ? text.substring(1) : text);
    }

    private static String decode(byte[] bytes, String head, DxfFaults faults) {
        Optional<String> utf8 = strictly(bytes, StandardCharsets.UTF_8);
        if (head.startsWith(BYTE_ORDER_MARK) && utf8.isPresent()) {
            return utf8.get();
        }
        String version = find(VERSION, head);
        String page = find(CODE_PAGE, head);
        if (version.isEmpty() ? page.isEmpty() : version.compareTo(FIRST_UTF8) >= 0) {
            if (utf8.isPresent()) {
                return utf8.get();
            }
        } else if (isAscii(bytes)) {
            return new String(bytes, StandardCharsets.US_ASCII);
        }
        Optional<Charset> charset = charset(page);
        if (charset.isEmpty()) {
            faults.warning(
                    "code-page",
                    1,
                    (page.isEmpty()
                                    ? "the file names no code page"
                                    : "its code page " + DxfFaults.quote(page) + " is not known")
                            + ", but holds letters beyond ASCII; " + (utf8.isPresent() ? "UTF-8" : "windows-1252")
                            + " is taken",
                    "check names with such letters");
            return utf8.orElseGet(() -> new String(bytes, Charset.forName("windows-1252")));
        }
        return new String(bytes, charset.get());
    }

    private static boolean isAscii(byte[] bytes) {
        for (byte b : bytes) {
            if (b < 0) {
                return false;
            }
        }
        return true;
    }

    private static String find(Pattern variable, String head) {
        Matcher matcher = variable.matcher(head);
        return matcher.find() ? matcher.group(1).strip() : "";
    }

    private static Optional<String> strictly(byte[] bytes, Charset charset) {
        try {
            return Optional.of(
                    charset.newDecoder().decode(ByteBuffer.wrap(bytes)).toString());
        } catch (CharacterCodingException e) {
            return Optional.empty();
        }
    }

    private static Optional<Charset> charset(String page) {
        String lower = page.toLowerCase(Locale.ROOT)
                .replace("ansi_", "")
                .replace("ansi", "")
                .replace("_", "");
        String name = switch (lower) {
            case "" -> "";
            case "874" -> "x-windows-874";
            case "932", "dos932" -> "windows-31j";
            case "936", "gb2312" -> "GBK";
            case "949", "ksc5601" -> "x-windows-949";
            case "950", "big5" -> "Big5";
            case "1361", "johab" -> "x-Johab";
            case "utf8", "utf-8", "65001" -> "UTF-8";
            case "macroman", "mac-roman" -> "x-MacRoman";
            case "ascii" -> "windows-1252";
            default ->
                lower.matches("125[0-8]")
                        ? "windows-" + lower
                        : lower.matches("dos\\d{3}")
                                ? "IBM" + lower.substring(3)
                                : lower.matches("iso8859-?\\d{1,2}")
                                        ? "ISO-8859-" + lower.replaceAll("iso8859-?", "")
                                        : "";
        };
        return name.isEmpty() || !Charset.isSupported(name) ? Optional.empty() : Optional.of(Charset.forName(name));
    }

    /** A name with its escapes, such as {@code \U+00E4} and {@code %%d}, as what they stand for. */
    static String name(String written) {
        if (written.indexOf('\\') < 0 && !written.contains("%%")) {
            return written;
        }
        return ESCAPE.matcher(written)
                .replaceAll(m -> Matcher.quoteReplacement(
                        m.group(1) != null
                                ? String.valueOf((char) Integer.parseInt(m.group(1), 16))
                                : special(m.group(2))));
    }

    private static String special(String sign) {
        return switch (sign.toLowerCase(Locale.ROOT)) {
            case "d" -> "°";
            case "p" -> "±";
            case "c" -> "⌀";
            case "%" -> "%";
            default -> String.valueOf((char) Integer.parseInt(sign));
        };
    }
}
