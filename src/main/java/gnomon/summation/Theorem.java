package gnomon.summation;

/// The theorems by which infinite series get their values.
public enum Theorem {
  /// Σ z^k/k! = e^z.
  EXPONENTIAL_SERIES,
  /// Σ (a)↑k z^k/k! = (1 − z)^(−a), with the geometric series for a = 1.
  BINOMIAL_SERIES,
  /// Σ z^k/(2k)! ↔ cosh and Σ z^k/(2k+1)! ↔ sinh.
  CIRCULAR_SERIES,
  /// Σ z^(k+1)/(k+1) = −ln(1 − z).
  LOGARITHMIC_SERIES,
  /// Euler's values of Σ 1/k^(2m), and Σ (1/k − 1/(k+u)) = H(u).
  RECIPROCAL_POWERS,
  /// Σ (−1)^k/(k + 1)^(2m) and Σ (−1)^k/(2k+1) = π/4.
  ALTERNATING_POWERS,
  /// 2F1(a, b; c; 1) = Γ(c) Γ(c−a−b)/(Γ(c−a) Γ(c−b)), DLMF 15.4.20.
  GAUSS,
  /// 2F1(a, b; 1+a−b; −1) = Γ(1+a−b) Γ(1+a/2)/(Γ(1+a) Γ(1+a/2−b)), DLMF 15.4.26.
  KUMMER,
  /// The value of a well-poised 3F2 at 1, DLMF 16.4.4.
  DIXON
}
