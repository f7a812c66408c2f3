package loopwright.file;

import static loopwright.file.ResultJson.list;
import static loopwright.file.ResultJson.member;
import static loopwright.file.ResultJson.number;
import static loopwright.file.ResultJson.text;

import java.util.List;
import java.util.Locale;
import java.util.Optional;
import loopwright.propose.FirstDesign;

/** A first design as JSON, for scripts: SI numbers; what does not exist is null. */
public final class FirstDesignJson {
  private FirstDesignJson() {}

  /**
   * The whole text, with a line break at its end.
   *
   * @param files writes the design itself
   */
  public static String write(FirstDesign first, DesignFile files) {
    Json design =
        first
            .design()
            .map(made -> JsonReader.read(files.write(made, Optional.empty()), "design"))
            .orElseGet(ResultJson::nothing);
    return JsonWriter.write(
        Json.block(
            List.of(
                member("says", text(first.says())),
                member(
                    "demands",
                    list(
                        first.demands(),
                        demand ->
                            Json.block(
                                List.of(
                                    member("name", text(demand.name())),
                                    member("wanted", number(demand.wanted())),
                                    member("predicted", number(demand.predicted())),
                                    member("unit", text(demand.unit().symbol())),
                                    member("met", Json.truth(demand.met())),
                                    member("says", text(demand.says())))))),
                member(
                    "reasons",
                    list(
                        first.reasons(),
                        reason ->
                            Json.block(
                                List.of(
                                    member("path", text(reason.path())),
                                    member("value", text(reason.value())),
                                    member("says", text(reason.says())))))),
                member(
                    "findings",
                    list(
                        first.findings(),
                        finding ->
                            Json.block(
                                List.of(
                                    member(
                                        "severity",
                                        text(finding.severity().name().toLowerCase(Locale.ROOT))),
                                    member("where", text(finding.where())),
                                    member("says", text(finding.says())),
                                    member("remedy", text(finding.remedy())))))),
                member("design", design))));
  }
}
