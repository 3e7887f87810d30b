package tepor.mesher.dxf;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import tepor.mesher.dxf.DxfFaults.Fault;

/** Sorts the records of a DXF file into header, layers, blocks and entities. */
final class DxfDocumentReader {
    private static final int FROZEN = 1;

    private final DxfScanner scanner;
    private final DxfFaults faults;
    private final DxfDocument document = new DxfDocument();

    private String section = "";
    private int sectionLine;
    private boolean entitiesSeen;
    private boolean ended;
    private String variable = "";
    private DxfRecord block;
    private List<DxfRecord> inBlock = new ArrayList<>();
    private DxfRecord parent; // takes the vertices or attributes that follow

    private DxfDocumentReader(DxfScanner scanner, DxfFaults faults) {
        this.scanner = scanner;
        this.faults = faults;
    }

    /** What is in a text; empty, with an error, where it is not DXF at all. */
    static Optional<DxfDocument> read(String text, DxfFaults faults) {
        DxfDocumentReader reader = new DxfDocumentReader(new DxfScanner(text, faults), faults);
        return reader.readAll() ? Optional.of(reader.document) : Optional.empty();
    }

    private boolean readAll() {
        DxfRecord record = null;
        boolean first = true;
        boolean more = scanner.next();
        if (!more) {
            if (faults.isEmpty()) {
                faults.error("empty-outline", 1, "the file is empty", "save the drawing as DXF in text form (ASCII)");
            }
            return false;
        }
        while (more) {
            boolean begins = scanner.code() == 0;
            if (first && !(begins && scanner.value().equals("SECTION"))) {
                faults.error(
                        "no-dxf",
                        scanner.line(),
                        "this is not a DXF file: it does not begin with 0, SECTION",
                        "save the drawing as DXF in text form (ASCII)");
                return false;
            }
            first = false;
            if (begins) {
                take(record);
                record = new DxfRecord(scanner.value(), scanner.line());
                if (scanner.value().equals("EOF")) {
                    break; // whatever stands behind it does not belong to the drawing
                }
            } else {
                record.add(scanner.code(), scanner.value(), scanner.line());
            }
            more = scanner.next();
            if (scanner.isDamaged()) {
                record = new DxfRecord("", scanner.line()); // what was damaged is reported, and left out
            }
        }
        boolean cutOff = !section.isEmpty() && !more && !isEnd(record);
        if (!cutOff) {
            take(record);
        }
        checkEnd();
        return true;
    }

    private static boolean isEnd(DxfRecord record) {
        return record.type().equals("ENDSEC") || record.type().equals("EOF");
    }

    private void checkEnd() {
        if (!section.isEmpty()) {
            faults.error(
                    "file-cut-off",
                    scanner.line(),
                    "the file ends within its section " + section + " (line " + sectionLine + "): the rest is missing",
                    "save or copy the drawing again");
        } else if (!ended) {
            faults.warning(
                    "no-eof",
                    scanner.line(),
                    "the file does not end with 0, EOF",
                    "save it again, lest something be missing");
        }
        if (!entitiesSeen && section.isEmpty()) {
            faults.error(
                    "no-entities",
                    scanner.line(),
                    "the file has no section ENTITIES, where the drawing stands",
                    "save the whole drawing as DXF");
        }
    }

    private void take(DxfRecord record) {
        if (record == null || record.type().isEmpty()) {
            return;
        }
        switch (record.type()) {
            case "SECTION" -> begin(record);
            case "ENDSEC" -> {
                checkEnded(record);
                endBlock();
                section = "";
                parent = null;
            }
            case "EOF" -> ended = true;
            default -> {
                switch (section) {
                    case "TABLES" -> takeTable(record);
                    case "BLOCKS" -> takeOfBlocks(record);
                    case "ENTITIES" -> takeEntity(record, document.entities());
                    default -> {
                        // Classes, objects and whatever else hold nothing that is drawn.
                    }
                }
            }
        }
    }

    private void begin(DxfRecord record) {
        if (!section.isEmpty()) {
            faults.warning(
                    "no-endsec",
                    record.line(),
                    "section " + section + " (line " + sectionLine + ") is not ended by ENDSEC before this one begins",
                    "save the drawing again, lest something be missing");
            endBlock();
        }
        section = record.text(2, "?");
        sectionLine = record.line();
        entitiesSeen |= section.equals("ENTITIES");
        parent = null;
        if (section.equals("HEADER")) {
            for (DxfRecord.Group group : record.groups()) {
                if (group.code() == 9) {
                    variable = group.value();
                } else if (!variable.isEmpty()) {
                    document.setVariable(variable, group);
                }
            }
        }
    }

    private void takeTable(DxfRecord record) {
        if (!record.type().equals("LAYER") || !record.has(2)) {
            return;
        }
        try {
            boolean frozen = (record.integer(70, 0) & FROZEN) != 0;
            boolean off = record.integer(62, 7) < 0;
            document.addLayer(new DxfDocument.Layer(DxfDecoder.name(record.text(2, "")), frozen, off));
        } catch (Fault fault) {
            faults.error(fault);
        }
    }

    private void takeOfBlocks(DxfRecord record) {
        switch (record.type()) {
            case "BLOCK" -> {
                endBlock();
                block = record;
            }
            case "ENDBLK" -> endBlock();
            default -> {
                if (block != null) {
                    takeEntity(record, inBlock);
                }
            }
        }
    }

    private void endBlock() {
        if (block != null) {
            document.addBlock(new DxfDocument.Block(DxfDecoder.name(block.text(2, "")), block, inBlock));
        }
        block = null;
        inBlock = new ArrayList<>();
        parent = null;
    }

    private void checkEnded(DxfRecord record) {
        if (parent != null && parent.type().equals("POLYLINE")) {
            faults.warning(
                    "no-seqend",
                    record.line(),
                    "the POLYLINE of line " + parent.line() + " is not ended by SEQEND before this " + record.type(),
                    "save the drawing again, lest vertices be missing");
        }
    }

    private void takeEntity(DxfRecord record, List<DxfRecord> entities) {
        boolean part = record.type().equals("VERTEX") || record.type().equals("ATTRIB");
        if (record.type().equals("SEQEND")) {
            parent = null;
            return;
        }
        if (part && parent != null) {
            parent.children().add(record);
            return;
        }
        checkEnded(record);
        parent = record.type().equals("POLYLINE") || record.type().equals("INSERT") ? record : null;
        if (record.type().equals("VERTEX")) {
            faults.error(
                    "stray-vertex",
                    record.line(),
                    "this VERTEX belongs to no POLYLINE",
                    "a line above it is damaged, or the POLYLINE is missing: save the drawing again");
            return;
        }
        entities.add(record);
    }
}
