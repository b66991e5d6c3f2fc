package gnomon.operator;

import gnomon.form.Form;
import gnomon.form.Variable;
import java.util.Collections;
import java.util.SortedMap;

/// What an operator is decided by: its symbol, its boundary parts, reduced modulo the kernels and
/// without zeros, and its kernel orders.
record NormalForm(
    Form symbol, SortedMap<Variable, Form> boundaries, SortedMap<Variable, Integer> kernelOrders) {

  NormalForm {
    kernelOrders = Collections.unmodifiableSortedMap(kernelOrders);
    boundaries = Collections.unmodifiableSortedMap(Kernels.reduce(boundaries, kernelOrders));
  }
}
