package sill.worker;

import java.io.ByteArrayOutputStream;
import java.io.DataOutputStream;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.Collection;
import java.util.Map;
import java.util.function.BiConsumer;

/** Writes one message as bytes: numbers big-endian, texts and lists with their length before them. */
final class WireOut {
    private final ByteArrayOutputStream bytes = new ByteArrayOutputStream();
    private final DataOutputStream out = new DataOutputStream(bytes);

    byte[] bytes() {
        return bytes.toByteArray();
    }

    WireOut flag(boolean value) {
        return number(value ? 1 : 0);
    }

    WireOut number(int value) {
        try {
            out.writeInt(value);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
        return this;
    }

    WireOut whole(long value) {
        try {
            out.writeLong(value);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
        return this;
    }

    WireOut real(double value) {
        try {
            out.writeDouble(value);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
        return this;
    }

    WireOut reals(double[] values) {
        number(values.length);
        for (double value : values) {
            real(value);
        }
        return this;
    }

    WireOut text(String value) {
        return raw(value.getBytes(StandardCharsets.UTF_8));
    }

    WireOut raw(byte[] value) {
        number(value.length);
        bytes.writeBytes(value);
        return this;
    }

    WireOut texts(Collection<String> values) {
        return list(values, WireOut::text);
    }

    <T> WireOut list(Collection<T> values, BiConsumer<WireOut, T> each) {
        number(values.size());
        values.forEach(value -> each.accept(this, value));
        return this;
    }

    <T> WireOut map(Map<String, T> values, BiConsumer<WireOut, T> each) {
        number(values.size());
        values.forEach((key, value) -> each.accept(text(key), value));
        return this;
    }
}
