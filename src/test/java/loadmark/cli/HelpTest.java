package loadmark.cli;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.ByteArrayInputStream;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import loadmark.report.Version;
import org.junit.jupiter.api.Test;
import picocli.CommandLine;
import picocli.CommandLine.Model.OptionSpec;

class HelpTest {
  private static String run(String... arguments) {
    ByteArrayOutputStream out = new ByteArrayOutputStream();
    ByteArrayOutputStream err = new ByteArrayOutputStream();
    int status = Loadmark.run(arguments, new ByteArrayInputStream(new byte[0]), out, err);
    assertThat(status).isZero();
    assertThat(err.size()).isZero();
    return out.toString(StandardCharsets.UTF_8);
  }

  @Test
  void helpNamesEveryOptionAndCommandThatThereIs() {
    CommandLine root = Options.commandLine();
    assertThat(run("--help")).contains(root.getSubcommands().keySet());
    root.getSubcommands()
        .forEach(
            (name, command) ->
                assertThat(run(name, "--help"))
                    .contains(
                        command.getCommandSpec().options().stream()
                            .map(OptionSpec::longestName)
                            .toList())
                    .contains(Format.words(name)));
  }

  @Test
  void helpFitsANarrowTerminal() {
    for (String topic : new String[] {"check", "curve"}) {
      assertThat(run(topic, "--help").lines())
          .allSatisfy(line -> assertThat(line.length()).isLessThanOrEqualTo(85));
    }
  }

  @Test
  void versionIsThatOfTheBuild() throws IOException {
    assertThat(run("--version")).isEqualTo("loadmark " + Version.CURRENT + "\n");
    assertThat(Files.readString(Path.of("pom.xml")))
        .contains(
            "<artifactId>loadmark</artifactId>\n  <version>" + Version.CURRENT + "</version>");
  }
}
