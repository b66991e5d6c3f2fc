package gnomon.modular;

/// A row of sums of products modulo p that are reduced late: every place holds a number below 4p²,
/// and after at most four more products below p² one subtraction of 4p² brings it back.
///
/// Adding a multiple of a row is a loop over one statement, of which just-in-time compilers make
/// vector instructions; up to some hundred places that beats every transform.
final class LazyRow {

  private final PrimeField field;
  private final long[] sums;
  private int pending;
  private int lowest;

  /// A row of zeros.
  LazyRow(PrimeField field, int length) {
    this.field = field;
    this.sums = new long[length];
  }

  /// Adds the coefficients of factor · x^shift · row that have a place.
  void add(int[] row, int count, int shift, int factor) {
    if (factor != 0) {
      addProduct(sums, shift, row, Math.min(count, sums.length - shift), factor);
      lowest = pending == 0 ? shift : Math.min(lowest, shift);
      pending++;
      if (pending == 4) {
        fold();
      }
    }
  }

  private static void addProduct(long[] sums, int to, int[] row, int count, long factor) {
    for (int j = 0; j < count; j++) {
      sums[to + j] += row[j] * factor;
    }
  }

  private void fold() {
    long bound = 4L * field.prime() * field.prime();
    fold(sums, lowest, sums.length - lowest, bound);
    pending = 0;
  }

  private static void fold(long[] sums, int from, int count, long bound) {
    for (int j = 0; j < count; j++) {
      long rest = sums[from + j] - bound;
      sums[from + j] = rest + ((rest >> 63) & bound);
    }
  }

  /// Adds the product of two lists.
  LazyRow addProduct(int[] a, int[] b) {
    int[] rows = a.length <= b.length ? a : b;
    int[] row = rows == a ? b : a;
    for (int i = 0; i < Math.min(rows.length, sums.length); i++) {
      add(row, row.length, i, rows[i]);
    }
    return this;
  }

  /// The residues.
  int[] residues() {
    int[] residues = new int[sums.length];
    long p = field.prime();
    for (int j = 0; j < residues.length; j++) {
      residues[j] = (int) (sums[j] % p);
    }
    return residues;
  }
}
