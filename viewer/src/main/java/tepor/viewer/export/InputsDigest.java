package tepor.viewer.export;

import java.nio.charset.StandardCharsets;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.HexFormat;
import java.util.List;
import tepor.solver.model.SourceFile;

/**
 * One digest for all files of a case: SHA-256 over the files' own digests as hexadecimal text in lower case, each followed
 * by a line feed, in the order in which the files were read, the case file first.
 *
 * <p>Anybody can check it: {@code sha256sum case.toml outline.wkt | cut -c1-64 | sha256sum}.
 */
public final class InputsDigest {
    private InputsDigest() {}

    /** 64 hexadecimal digits in lower case. */
    public static String of(List<SourceFile> files) {
        MessageDigest digest;
        try {
            digest = MessageDigest.getInstance("SHA-256");
        } catch (NoSuchAlgorithmException e) {
            throw new IllegalStateException("every Java platform has SHA-256", e);
        }
        for (SourceFile file : files) {
            digest.update((file.sha256() + "\n").getBytes(StandardCharsets.US_ASCII));
        }
        return HexFormat.of().formatHex(digest.digest());
    }
}
