package eddyledger.file;

import com.fasterxml.jackson.databind.node.ObjectNode;
import eddyledger.model.Supplier;

/** A supplier. */
final class SupplierCodec implements RecordCodec<Supplier> {
  static final SupplierCodec SUPPLIER = new SupplierCodec();

  private SupplierCodec() {}

  @Override
  public Supplier read(JsonObject object) {
    return new Supplier(object.text("id"), object.requiredText("name"), object.extras());
  }

  @Override
  public ObjectNode write(Supplier supplier) {
    return new JsonBuilder()
        .text("id", supplier.id())
        .name("name", supplier.name())
        .with(supplier.extras());
  }
}
