package sill.worker;

import java.nio.ByteBuffer;
import java.nio.charset.StandardCharsets;
import java.util.Arrays;
import java.util.Set;

/**
 * Leads a class's calls to the transcendental functions of {@code Math} to {@code StrictMath}: the former may differ in the
 * last bit from one JVM to the next, and a record is to be the same on all.
 *
 * <p>Only the constant pool is changed (The Java Virtual Machine Specification, Java SE 17 Edition, section 4.4): references to
 * these methods get another class, which is appended. Calls and method references alike go through them.
 */
final class StrictFunctions {
    /** Those whose documentation in {@code Math} allows an error, other than in {@code StrictMath}. */
    private static final Set<String> FUNCTIONS = Set.of(
            "sin", "cos", "tan", "asin", "acos", "atan", "atan2", "sinh", "cosh", "tanh", "exp", "expm1", "log",
            "log10", "log1p", "pow", "cbrt", "hypot");

    private static final int COUNT_AT = 8;
    private static final int POOL_AT = 10;
    private static final int MOST_CONSTANTS = 65_535;

    private final ByteBuffer in;
    private final int[] at;
    private int end;

    private StrictFunctions(byte[] classFile) {
        in = ByteBuffer.wrap(classFile.clone());
        at = new int[in.getShort(COUNT_AT) & 0xFFFF];
        findConstants();
    }

    /** The class file with such calls led there; the same bytes when it has none. */
    static byte[] in(byte[] classFile) {
        return new StrictFunctions(classFile).rewritten(classFile);
    }

    private void findConstants() {
        int position = POOL_AT;
        for (int i = 1; i < at.length; i++) {
            at[i] = position;
            int tag = in.get(position);
            position += 1 + length(tag, position);
            if (tag == 5 || tag == 6) {
                // A long or double takes two numbers.
                i++;
            }
        }
        end = position;
    }

    private int length(int tag, int position) {
        return switch (tag) {
            case 1 -> 2 + (in.getShort(position + 1) & 0xFFFF);
            case 5, 6 -> 8;
            case 7, 8, 16, 19, 20 -> 2;
            case 15 -> 3;
            default -> 4;
        };
    }

    private byte[] rewritten(byte[] classFile) {
        int strictMath = at.length + 1;
        boolean changed = false;
        for (int i = 1; i < at.length && strictMath < MOST_CONSTANTS; i++) {
            if (at[i] != 0 && in.get(at[i]) == 10 && isFunction(at[i])) {
                in.putShort(at[i] + 1, (short) strictMath);
                changed = true;
            }
        }
        return changed ? withStrictMath() : classFile;
    }

    private boolean isFunction(int methodReference) {
        int type = at[number(methodReference + 1)];
        int nameAndType = at[number(methodReference + 3)];
        return text(at[number(type + 1)]).equals("java/lang/Math")
                && FUNCTIONS.contains(text(at[number(nameAndType + 1)]));
    }

    private int number(int position) {
        return in.getShort(position) & 0xFFFF;
    }

    private String text(int constant) {
        return new String(in.array(), constant + 3, number(constant + 1), StandardCharsets.UTF_8);
    }

    /** The name and the class that refers to it, behind the other constants. */
    private byte[] withStrictMath() {
        byte[] name = "java/lang/StrictMath".getBytes(StandardCharsets.UTF_8);
        byte[] old = in.array();
        ByteBuffer out = ByteBuffer.allocate(old.length + 3 + name.length + 3);
        out.put(Arrays.copyOf(old, end));
        out.put((byte) 1).putShort((short) name.length).put(name);
        out.put((byte) 7).putShort((short) at.length);
        out.put(old, end, old.length - end);
        out.putShort(COUNT_AT, (short) (at.length + 2));
        return out.array();
    }
}
