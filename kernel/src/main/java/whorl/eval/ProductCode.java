package whorl.eval;

import whorl.check.Operation.Product;

/** Factors multiplied or divided from left to right. */
record ProductCode(Site whole, Factors factors) implements Code.Real {
  static ProductCode of(Product product, CodeWriter writer) {
    return new ProductCode(writer.site(product.span()), Factors.of(product.factors(), writer));
  }

  @Override
  public double in(Activation activation) {
    double first = factors.value(0, activation);
    double product = factors.isDivisor(0) ? factors.applied(1, 0, first, whole) : first;
    for (int i = 1; i < factors.count(); i++) {
      product = factors.applied(product, i, factors.value(i, activation), whole);
    }
    return product;
  }
}
