package org.foreseal.thermo;

import java.nio.ByteBuffer;
import java.nio.FloatBuffer;
import org.foreseal.quantity.CsvTable;

/**
 * Lower triangular factors L of the covariances of the enthalpy and entropy terms. The variance of
 * a sum x of terms is |L'x|^2, so it is never negative and keeps its digits where terms cancel.
 * Source and layout: resource {@code thermo/README.md}.
 */
final class CovarianceFactor {
  private final float[][] enthalpy;
  private final float[][] entropy;

  private CovarianceFactor(ByteBuffer bytes) {
    int enthalpyTerms = bytes.getInt();
    int entropyTerms = bytes.getInt();
    FloatBuffer values = bytes.asFloatBuffer();
    enthalpy = triangle(values, enthalpyTerms);
    entropy = triangle(values, entropyTerms);
    if (values.hasRemaining()) {
      throw new IllegalStateException("thermo/covariance-factor.bin is longer than it says");
    }
  }

  /** The shipped factors, read when first asked for. */
  static CovarianceFactor standard() {
    return Holder.STANDARD;
  }

  private static float[][] triangle(FloatBuffer values, int size) {
    float[][] rows = new float[size][];
    for (int i = 0; i < size; i++) {
      rows[i] = new float[i + 1];
      values.get(rows[i]);
    }
    return rows;
  }

  int enthalpyTerms() {
    return enthalpy.length;
  }

  int entropyTerms() {
    return entropy.length;
  }

  /**
   * Variance of a sum of terms.
   *
   * @param enthalpyCounts counts by enthalpy row, 0 where a term does not occur
   * @param entropyCounts counts by entropy row
   */
  TermVariance variance(double[] enthalpyCounts, double[] entropyCounts) {
    return new TermVariance(variance(enthalpy, enthalpyCounts), variance(entropy, entropyCounts));
  }

  private static double variance(float[][] factor, double[] counts) {
    double[] projected = new double[counts.length];
    for (int i = 0; i < counts.length; i++) {
      double x = counts[i];
      if (x != 0) {
        float[] row = factor[i];
        for (int j = 0; j < row.length; j++) {
          projected[j] += x * row[j];
        }
      }
    }
    double sum = 0;
    for (double p : projected) {
      sum += p * p;
    }
    return sum;
  }

  /** Reads the factors once, on first use. */
  private static final class Holder {
    static final CovarianceFactor STANDARD =
        new CovarianceFactor(ByteBuffer.wrap(CsvTable.bytes("/thermo/covariance-factor.bin")));
  }
}
