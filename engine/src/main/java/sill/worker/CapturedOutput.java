package sill.worker;

import java.io.OutputStream;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;

/** What a cell prints: the first part is kept, the rest is counted and let go. */
final class CapturedOutput extends OutputStream {
    private static final int MOST_BYTES = 64 * 1024;

    private final java.io.ByteArrayOutputStream kept = new java.io.ByteArrayOutputStream();
    private long lost;

    /** A stream that ends here, in UTF-8. */
    PrintStream stream() {
        return new PrintStream(this, true, StandardCharsets.UTF_8);
    }

    @Override
    public synchronized void write(int b) {
        if (kept.size() < MOST_BYTES) {
            kept.write(b);
        } else {
            lost++;
        }
    }

    @Override
    public synchronized void write(byte[] bytes, int offset, int length) {
        int taken = Math.min(length, MOST_BYTES - kept.size());
        kept.write(bytes, offset, taken);
        lost += length - taken;
    }

    /** What was printed since the last call. */
    synchronized String take() {
        String text = kept.toString(StandardCharsets.UTF_8);
        String rest = lost == 0 ? "" : "\n… " + lost + " more bytes were printed and are not kept\n";
        kept.reset();
        lost = 0;
        return text + rest;
    }
}
