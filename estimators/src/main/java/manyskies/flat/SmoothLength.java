package manyskies.flat;

/** Lengths a Fourier transform is quick at: even, with no prime factor but 2, 3 and 5. */
final class SmoothLength {
    private SmoothLength() {}

    /** Whether n is even, positive and 5-smooth. */
    static boolean isSmooth(int n) {
        if (n < 2 || n % 2 != 0) {
            return false;
        }
        int rest = n;
        for (int prime : new int[] {2, 3, 5}) {
            while (rest % prime == 0) {
                rest /= prime;
            }
        }
        return rest == 1;
    }

    /** The smallest such length that is at least n. */
    static int atLeast(int n) {
        int length = Math.max(2, n + n % 2);
        while (!isSmooth(length)) {
            length += 2;
        }
        return length;
    }

    /** The largest such length that is at most n, where n is 2 or more. */
    static int atMost(int n) {
        int length = n - n % 2;
        while (!isSmooth(length)) {
            length -= 2;
        }
        return length;
    }

    /**
     * Checks a side of a map.
     *
     * @throws IllegalArgumentException naming the nearest lengths, if n is none of these
     */
    static void require(String name, int n) {
        if (!isSmooth(n)) {
            throw new IllegalArgumentException(
                    name
                            + " = "
                            + n
                            + " pixels cannot be transformed: a side is even with no prime factor"
                            + " but 2, 3 and 5; the nearest are "
                            + atMost(Math.max(2, n))
                            + " and "
                            + atLeast(n));
        }
    }
}
