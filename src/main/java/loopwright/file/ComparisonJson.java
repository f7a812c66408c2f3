package loopwright.file;

import static loopwright.file.ResultJson.list;
import static loopwright.file.ResultJson.member;
import static loopwright.file.ResultJson.nothing;
import static loopwright.file.ResultJson.number;
import static loopwright.file.ResultJson.text;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import loopwright.bench.Comparison;
import loopwright.bench.ReadingVerdict;
import loopwright.bench.SetVerdict;
import loopwright.design.Reading;

/** A comparison as JSON, for scripts: SI numbers, uncertainties expanded. */
public final class ComparisonJson {
  private ComparisonJson() {}

  /** The whole text, with a line break at its end. */
  public static String write(Comparison comparison) {
    return JsonWriter.write(
        Json.block(
            List.of(
                member("readings", list(comparison.readings(), ComparisonJson::reading)),
                member("set", set(comparison.set())),
                member("implied", list(comparison.implied(), ResultJson::text)),
                member("suspects", list(comparison.suspects(), ResultJson::text)))));
  }

  private static Json reading(ReadingVerdict verdict) {
    Reading reading = verdict.reading();
    List<Json.Member> members = new ArrayList<>();
    reading.hookup().ifPresent(name -> members.add(member("hookup", text(name))));
    members.add(member("quantity", text(reading.quantity())));
    reading.node().ifPresent(name -> members.add(member("node", text(name))));
    reading.device().ifPresent(name -> members.add(member("device", text(name))));
    reading.part().ifPresent(name -> members.add(member("part", text(name))));
    reading
        .rail()
        .ifPresent(rail -> members.add(member("rail", text(rail.name().toLowerCase(Locale.ROOT)))));
    reading
        .frequency()
        .ifPresent(frequency -> members.add(member("frequency", number(frequency.value()))));
    members.add(member("measured", number(verdict.measured())));
    members.add(member("measuredUncertainty", number(verdict.measuredUncertainty())));
    members.add(member("predicted", number(verdict.predicted().number())));
    members.add(member("predictedLow", number(verdict.predictedLow())));
    members.add(member("predictedHigh", number(verdict.predictedHigh())));
    members.add(member("en", number(verdict.en())));
    members.add(member("agrees", truth(verdict.agrees())));
    members.add(member("says", text(verdict.says())));
    return Json.block(members);
  }

  private static Json set(SetVerdict set) {
    return Json.block(
        List.of(
            member("chiSquared", number(set.chiSquared())),
            member("degreesOfFreedom", Json.number(Integer.toString(set.degreesOfFreedom()))),
            member("probability", number(set.probability())),
            member(
                "agrees",
                truth(
                    set.probability().isPresent() ? Optional.of(set.agrees()) : Optional.empty())),
            member("says", text(set.says()))));
  }

  private static Json truth(Optional<Boolean> value) {
    return value.isPresent() ? Json.truth(value.get()) : nothing();
  }
}
