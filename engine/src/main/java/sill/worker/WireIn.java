package sill.worker;

import java.nio.BufferUnderflowException;
import java.nio.ByteBuffer;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.function.Function;

/**
 * Reads what {@link WireOut} wrote. Bytes that are no such message give a {@link BadMessage}, whatever they are: lengths are
 * held against what is there before anything is made from them.
 */
final class WireIn {
    private final ByteBuffer bytes;

    WireIn(byte[] message) {
        bytes = ByteBuffer.wrap(message);
    }

    /** Bytes that are no message. */
    static final class BadMessage extends RuntimeException {
        private static final long serialVersionUID = 1;

        BadMessage(String message) {
            super(message);
        }
    }

    boolean flag() {
        return number() != 0;
    }

    int number() {
        try {
            return bytes.getInt();
        } catch (BufferUnderflowException e) {
            throw new BadMessage("message ends too early");
        }
    }

    long whole() {
        try {
            return bytes.getLong();
        } catch (BufferUnderflowException e) {
            throw new BadMessage("message ends too early");
        }
    }

    double real() {
        try {
            return bytes.getDouble();
        } catch (BufferUnderflowException e) {
            throw new BadMessage("message ends too early");
        }
    }

    double[] reals() {
        double[] values = new double[count(Double.BYTES)];
        for (int i = 0; i < values.length; i++) {
            values[i] = real();
        }
        return values;
    }

    String text() {
        return new String(raw(), StandardCharsets.UTF_8);
    }

    byte[] raw() {
        byte[] value = new byte[count(1)];
        bytes.get(value);
        return value;
    }

    List<String> texts() {
        return list(WireIn::text);
    }

    <T> List<T> list(Function<WireIn, T> each) {
        int count = count(Integer.BYTES);
        // The claimed count is within the message, yet lists in lists could claim it again and again.
        List<T> values = new ArrayList<>(Math.min(count, 16));
        for (int i = 0; i < count; i++) {
            values.add(each.apply(this));
        }
        return values;
    }

    <T> Map<String, T> map(Function<WireIn, T> each) {
        int count = count(Integer.BYTES);
        Map<String, T> values = new LinkedHashMap<>();
        for (int i = 0; i < count; i++) {
            values.put(text(), each.apply(this));
        }
        return values;
    }

    <E extends Enum<E>> E constant(E[] constants) {
        int ordinal = number();
        if (ordinal < 0 || ordinal >= constants.length) {
            throw new BadMessage("message names constant " + ordinal + " of " + constants.length);
        }
        return constants[ordinal];
    }

    /** Tells that the message has been read to its end. */
    void end() {
        if (bytes.hasRemaining()) {
            throw new BadMessage("message goes on for " + bytes.remaining() + " bytes behind its end");
        }
    }

    /** A count of things that take at least {@code size} bytes each. */
    private int count(int size) {
        int count = number();
        if (count < 0 || (long) count * size > bytes.remaining()) {
            throw new BadMessage("message claims " + count + " items with " + bytes.remaining() + " bytes left");
        }
        return count;
    }
}
