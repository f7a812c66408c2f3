package loopwright.file;

import static loopwright.file.ResultJson.list;
import static loopwright.file.ResultJson.member;
import static loopwright.file.ResultJson.nothing;
import static loopwright.file.ResultJson.number;
import static loopwright.file.ResultJson.text;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import loopwright.predict.Catalogue;
import loopwright.predict.HookupFigures;
import loopwright.predict.NoiseBand;
import loopwright.predict.NoiseDensity;
import loopwright.predict.NoiseShare;

/** Noise as JSON, for scripts: V/√Hz and V rms, contributors the loudest first. */
public final class NoiseJson {
  private NoiseJson() {}

  /**
   * The whole text, with a line break at its end.
   *
   * @param frequencies of the densities, Hz; not modified
   */
  public static String write(HookupFigures figures, double[] frequencies) {
    List<Json.Member> members = new ArrayList<>();
    members.add(member("hookup", text(figures.hookup().name())));
    members.add(
        member(
            "densities",
            list(
                Arrays.stream(frequencies).boxed().toList(),
                frequency -> density(frequency, figures.noiseDensity(frequency)))));
    Optional<NoiseBand> band = figures.noiseBand();
    members.add(member("band", band.map(NoiseJson::band).orElse(nothing())));
    if (band.isEmpty()) {
      members.add(
          member(
              "reason", text(figures.solved(Catalogue.find("outputNoise").orElseThrow()).says())));
    }
    return JsonWriter.write(Json.block(members));
  }

  private static Json density(double frequency, Optional<NoiseDensity> density) {
    return Json.block(
        List.of(
            member("frequency", number(frequency)),
            member("output", density.map(d -> number(d.output())).orElse(nothing())),
            member("input", density.map(d -> number(d.input())).orElse(nothing())),
            member(
                "contributors",
                list(density.map(NoiseDensity::shares).orElse(List.of()), NoiseJson::share))));
  }

  private static Json band(NoiseBand band) {
    return Json.block(
        List.of(
            member("low", number(band.low())),
            member("high", number(band.high())),
            member("output", number(band.output())),
            member("contributors", list(band.shares(), NoiseJson::share))));
  }

  private static Json share(NoiseShare share) {
    return Json.block(
        List.of(
            member("part", text(share.name())),
            member("cause", text(share.cause())),
            member("output", number(share.output())),
            member("share", number(share.share()))));
  }
}
