package soakline.session;

import java.io.BufferedInputStream;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.InputStream;
import java.io.OutputStream;
import java.net.URI;
import java.nio.charset.StandardCharsets;
import java.nio.file.FileSystemNotFoundException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.security.DigestOutputStream;
import java.security.MessageDigest;
import java.time.DateTimeException;
import java.time.Instant;
import java.util.Arrays;
import java.util.HashMap;
import java.util.Map;
import java.util.Optional;
import soakline.intake.Progress;
import soakline.intake.ReadOptions;
import soakline.intake.RunFileReader;
import soakline.problem.Code;
import soakline.problem.Fault;
import soakline.specimen.QuotedText;
import soakline.workspace.OutputFile;
import soakline.workspace.RunFileText;
import soakline.workspace.Workspace;

/**
 * A recovery copy on the disk: lines about the document, its workspace as a run file, and in the last line the digest of all that
 * stands above, which shows whether the copy is whole. All lines but the run file's begin with {@code #}, so that the copy itself
 * can be opened as a run file by hand.
 */
final class RecoveryCopy {

    private static final String FIRST = "# recovery copy: 1";
    private static final String LAST_OF_HEAD = "# the run file follows";
    private static final String SEAL = "# whole: ";
    private static final int SEAL_LENGTH = SEAL.length() + 64 + 1;
    private static final int MOST_LINES = 10;
    private static final int LONGEST_LINE = 100_000;

    private static final String FILE = "file";
    private static final String NAME = "name";
    private static final String DIGEST = "digest";
    private static final String IN_PLACE = "in place";
    private static final String KEPT = "kept";

    private RecoveryCopy() {}

    /**
     * What a copy says about its document.
     *
     * @param original where the document was read from; empty when it came from no file
     */
    record Head(Optional<Path> original, String name, String digest, boolean inPlace, Instant kept) {}

    /** Writes a copy whole or not at all. */
    static void write(Path copy, Document document, Workspace workspace, Instant now) {
        MessageDigest sha256 = Digests.sha256();
        OutputFile.write(copy, out -> {
            OutputStream sealed = new DigestOutputStream(out, sha256);
            StringBuilder head = new StringBuilder(FIRST).append('\n');
            // as an address, which holds any name a file can have
            document.file().ifPresent(f -> line(head, FILE, f.toUri().toString()));
            line(head, NAME, QuotedText.fact(document.name()));
            line(head, DIGEST, document.digest());
            line(head, IN_PLACE, Boolean.toString(document.canSaveInPlace()));
            line(head, KEPT, now.toString());
            head.append(LAST_OF_HEAD).append('\n');
            sealed.write(head.toString().getBytes(StandardCharsets.UTF_8));
            RunFileText.write(workspace, sealed);
            String seal = SEAL + Digests.hex(sha256) + "\n";
            out.write(seal.getBytes(StandardCharsets.US_ASCII));
        });
    }

    private static void line(StringBuilder head, String name, String value) {
        head.append("# ").append(name).append(": ").append(value).append('\n');
    }

    /**
     * What a copy says about its document, without a look at the rest.
     *
     * @return empty when it says nothing of the kind
     */
    static Optional<Head> head(Path copy) {
        try (InputStream in = new BufferedInputStream(Files.newInputStream(copy))) {
            return head(in);
        } catch (IOException e) {
            return Optional.empty();
        }
    }

    private static Optional<Head> head(InputStream in) throws IOException {
        Map<String, String> facts = new HashMap<>();
        String line = line(in);
        if (!line.equals(FIRST)) {
            return Optional.empty();
        }
        for (int k = 0; k < MOST_LINES; k++) {
            line = line(in);
            if (line.equals(LAST_OF_HEAD)) {
                return head(facts);
            }
            int colon = line.indexOf(": ");
            if (colon > 2) {
                facts.put(line.substring(2, colon), line.substring(colon + 2));
            }
        }
        return Optional.empty();
    }

    private static Optional<Head> head(Map<String, String> facts) {
        try {
            return Optional.of(new Head(
                    Optional.ofNullable(facts.get(FILE)).map(f -> Path.of(URI.create(f))),
                    QuotedText.read(facts.getOrDefault(NAME, "")),
                    facts.getOrDefault(DIGEST, ""),
                    Boolean.parseBoolean(facts.get(IN_PLACE)),
                    Instant.parse(facts.getOrDefault(KEPT, ""))));
        } catch (IllegalArgumentException | FileSystemNotFoundException | DateTimeException e) {
            return Optional.empty();
        }
    }

    private static String line(InputStream in) throws IOException {
        ByteArrayOutputStream line = new ByteArrayOutputStream();
        int b = in.read();
        while (b >= 0 && b != '\n' && line.size() < LONGEST_LINE) {
            line.write(b);
            b = in.read();
        }
        return line.toString(StandardCharsets.UTF_8);
    }

    /**
     * The document of a copy, unsaved.
     *
     * @throws Fault {@link Code#RECOVERY_DAMAGED}
     */
    static Document read(Path copy) {
        try {
            requireWhole(copy);
            try (InputStream in = new BufferedInputStream(Files.newInputStream(copy))) {
                Head head = head(in).orElseThrow(() -> damaged(copy));
                Workspace workspace = OpenFile.workspace(
                        RunFileReader.open(in, Files.size(copy), head.name(), ReadOptions.of(), Progress.NONE));
                return Document.unsaved(head.original(), head.name(), head.digest(), workspace, head.inPlace());
            }
        } catch (IOException e) {
            throw damaged(copy);
        } catch (Fault fault) {
            throw fault.finding().code() == Code.RECOVERY_DAMAGED ? fault : damaged(copy);
        }
    }

    private static void requireWhole(Path copy) throws IOException {
        long sealed = Files.size(copy) - SEAL_LENGTH;
        if (sealed < 0) {
            throw damaged(copy);
        }
        MessageDigest sha256 = Digests.sha256();
        byte[] seal;
        try (InputStream in = new BufferedInputStream(Files.newInputStream(copy))) {
            byte[] piece = new byte[1 << 16];
            long left = sealed;
            while (left > 0) {
                int n = in.readNBytes(piece, 0, (int) Math.min(piece.length, left));
                if (n == 0) {
                    throw damaged(copy);
                }
                sha256.update(piece, 0, n);
                left -= n;
            }
            seal = in.readNBytes(SEAL_LENGTH);
        }
        String expected = SEAL + Digests.hex(sha256) + "\n";
        if (!Arrays.equals(seal, expected.getBytes(StandardCharsets.US_ASCII))) {
            throw damaged(copy);
        }
    }

    private static Fault damaged(Path copy) {
        return Fault.of(Code.RECOVERY_DAMAGED, copy.toString());
    }
}
