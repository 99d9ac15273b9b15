package freshet.http.media;

import java.util.Arrays;

/** A growing row of bytes. */
public final class Bytes {

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

    /** Appends a whole number that is not negative. */
    void putLong(long number) {
        int places = 1;
        for (long rest = number; rest >= 10; rest /= 10) {
            places++;
        }
        putPadded(number, places);
    }

    /** Appends a whole number that is not negative, with leading zeros up to the given number of places. */
    void putPadded(long number, int places) {
        reserve(places);
        long rest = number;
        for (int i = length + places - 1; i >= length; i--) {
            array[i] = (byte) ('0' + rest % 10);
            rest /= 10;
        }
        length += places;
    }

    private void reserve(int more) {
        if (length + more > array.length) {
            array = Arrays.copyOf(array, Math.max(2 * array.length, length + more));
        }
    }
}
