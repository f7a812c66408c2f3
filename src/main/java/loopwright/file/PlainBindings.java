package loopwright.file;

/** Texts, switches and counts. */
final class PlainBindings {
  static final Binding<String> TEXT =
      new Binding<>() {
        @Override
        public String read(Json json, Spot spot) {
          if (json instanceof Json.Text text) {
            return text.value();
          }
          throw spot.misfit(json, expected());
        }

        @Override
        public Json write(String value) {
          return Json.text(value);
        }

        @Override
        public String expected() {
          return "a text in quotes";
        }
      };

  static final Binding<Boolean> SWITCH =
      new Binding<>() {
        @Override
        public Boolean read(Json json, Spot spot) {
          if (json instanceof Json.Truth truth) {
            return truth.value();
          }
          throw spot.misfit(json, expected());
        }

        @Override
        public Json write(Boolean value) {
          return Json.truth(value);
        }

        @Override
        public String expected() {
          return "true or false";
        }
      };

  static final Binding<Integer> COUNT =
      new Binding<>() {
        @Override
        public Integer read(Json json, Spot spot) {
          if (json instanceof Json.Number number) {
            double value = Double.parseDouble(number.literal());
            if (value == Math.rint(value) && Math.abs(value) <= Integer.MAX_VALUE) {
              return (int) value;
            }
          }
          throw spot.misfit(json, expected());
        }

        @Override
        public Json write(Integer value) {
          return Json.number(Integer.toString(value));
        }

        @Override
        public String expected() {
          return "a whole number";
        }
      };

  private PlainBindings() {}
}
