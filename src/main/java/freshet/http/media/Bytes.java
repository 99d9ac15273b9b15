package freshet.http.media;

import java.lang.invoke.MethodHandles;
import java.lang.invoke.VarHandle;
import java.nio.ByteOrder;
import java.util.Arrays;

/** A growing row of bytes. */
public final class Bytes {

    private static final VarHandle EIGHT_BYTES =
            MethodHandles.byteArrayViewVarHandle(long[].class, ByteOrder.LITTLE_ENDIAN);
    private static final int SIX = 6;
    /** Zeros, a point and six digits, which are put eight bytes at a time. */
    private static final int LONGEST_DECIMAL = 32;
    /** The ASCII digits of 0 to 999, three to each, the first in the lowest byte. */
    private static final int[] THREE_DIGITS = new int[1000];

    static {
        for (int i = 0; i < THREE_DIGITS.length; i++) {
            THREE_DIGITS[i] = '0' + i / 100 | '0' + i / 10 % 10 << 8 | '0' + i % 10 << 16;
        }
    }

    private byte[] array;
    private int length;

    /** Room for {@code capacity} bytes before it has to grow. */
    public Bytes(int capacity) {
        array = new byte[capacity];
    }

    /** The bytes, of which the first {@link #length()} count. */
    public byte[] array() {
        return array;
    }

    /** How many bytes there are. */
    public int length() {
        return length;
    }

    /** Appends an ASCII character. */
    public void put(char ascii) {
        reserve(1);
        array[length++] = (byte) ascii;
    }

    /** Appends bytes. */
    public void put(byte[] bytes) {
        reserve(bytes.length);
        System.arraycopy(bytes, 0, array, length, bytes.length);
        length += bytes.length;
    }

    /** Appends a part of {@code chars}, each of them one byte. */
    public void put(char[] chars, int start, int end) {
        reserve(end - start);
        for (int i = start; i < end; i++) {
            array[length++] = (byte) chars[i];
        }
    }

    /** Appends a part of {@code bytes}. */
    public void put(byte[] bytes, int offset, int count) {
        reserve(count);
        System.arraycopy(bytes, offset, array, length, count);
        length += count;
    }

    /** Takes back the last byte. */
    void dropLast() {
        length--;
    }

    /** Takes back all but the first {@code count} bytes. */
    public void dropTo(int count) {
        length = count;
    }

    /**
     * Appends a decimal.
     *
     * @param six its six leading digits
     * @param significant how many of them count, the rest being zeros
     * @param whole how many digits stand before the point; 0 or less for a number below 1
     */
    void putDecimal(int six, int significant, int whole) {
        reserve(LONGEST_DECIMAL);
        long digits = THREE_DIGITS[six / 1000] | (long) THREE_DIGITS[six % 1000] << 24;
        int at = length;
        int before = Math.min(Math.max(whole, 0), SIX);
        if (whole <= 0) {
            array[at++] = '0';
        } else {
            EIGHT_BYTES.set(array, at, digits);
            at += before;
        }
        at = zeros(whole - SIX, at);
        if (significant > whole) {
            array[at++] = '.';
            at = zeros(-whole, at);
            EIGHT_BYTES.set(array, at, digits >>> 8 * before);
            at += significant - before;
        }
        length = at;
    }

    private int zeros(int count, int from) {
        for (int i = 0; i < count; i++) {
            array[from + i] = '0';
        }
        return from + Math.max(0, count);
    }

    private void reserve(int more) {
        if (length + more > array.length) {
            array = Arrays.copyOf(array, Math.max(2 * array.length, length + more));
        }
    }
}
