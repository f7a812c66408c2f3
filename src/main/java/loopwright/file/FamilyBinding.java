package loopwright.file;

import java.util.LinkedHashMap;
import java.util.Map;

/**
 * A sealed family, whose member {@code kind} says which variant a block is.
 *
 * @param <T> the sealed interface
 */
final class FamilyBinding<T> implements Binding<T> {
  /**
   * A variant.
   *
   * @param type its record
   * @param binding how it is read and written
   */
  record Variant<V>(Class<V> type, BlockBinding<V> binding) {}

  private final Map<String, Variant<? extends T>> variants;
  private final KnownWords kinds;

  /**
   * @param variants by the word for their kind
   */
  FamilyBinding(Map<String, Variant<? extends T>> variants) {
    this.variants = new LinkedHashMap<>(variants);
    this.kinds = new KnownWords(variants.keySet().stream().toList());
  }

  @Override
  public T read(Json json, Spot spot) {
    if (!(json instanceof Json.Block block)) {
      throw spot.misfit(json, expected());
    }
    Spot kindSpot = spot.member(BlockBinding.KIND, block);
    Json kind =
        block
            .get(BlockBinding.KIND)
            .orElseThrow(() -> kindSpot.misfit("found nothing, expected " + kinds.says()));
    if (!(kind instanceof Json.Text word)) {
      throw kindSpot.misfit(kind, kinds.says());
    }
    if (!kinds.contains(word.value())) {
      throw kindSpot.misfit(kind, kinds.insteadOf(word.value()));
    }
    return variants.get(word.value()).binding().read(json, spot);
  }

  @Override
  public Json write(T value) {
    return writeAs(variantOf(value), value);
  }

  private static <V> Json writeAs(Variant<V> variant, Object value) {
    return variant.binding().write(variant.type().cast(value));
  }

  @Override
  public Json rewrite(T value, Before<T> before) {
    return value.getClass().equals(before.value().getClass())
        ? rewriteAs(variantOf(value), value, before)
        : write(value);
  }

  private static <V> Json rewriteAs(Variant<V> variant, Object value, Before<?> before) {
    return variant
        .binding()
        .rewrite(
            variant.type().cast(value),
            new Before<>(variant.type().cast(before.value()), before.json()));
  }

  private Variant<? extends T> variantOf(T value) {
    return variants.values().stream()
        .filter(variant -> variant.type().isInstance(value))
        .findFirst()
        .orElseThrow(() -> new IllegalStateException("no variant for " + value.getClass()));
  }

  @Override
  public String expected() {
    return "a block {…} whose kind is " + kinds.says();
  }

  @Override
  public boolean isNamed() {
    return variants.values().stream().allMatch(variant -> variant.binding().isNamed());
  }
}
