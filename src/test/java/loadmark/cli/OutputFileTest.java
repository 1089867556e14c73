package loadmark.cli;

import static org.assertj.core.api.Assertions.assertThat;
import static org.junit.jupiter.api.Assumptions.assumeTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;
import loadmark.diagnostic.Findings;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class OutputFileTest {
  @TempDir Path folder;

  private final Findings findings = new Findings();

  private boolean write(Path target) {
    return OutputFile.write(target.toString(), "new", List.of(), findings);
  }

  @Test
  void earlierContentIsReplacedAtOnce() throws IOException {
    Path target = Files.writeString(folder.resolve("a"), "a longer text than the new one");
    assertThat(write(target)).isTrue();
    assertThat(target).hasContent("new");
    assertNothingElseIsLeft(target);
  }

  @Test
  void linkStaysALink() throws IOException {
    Path target = Files.writeString(folder.resolve("a"), "old");
    Path link = Files.createSymbolicLink(folder.resolve("link"), target);
    assertThat(write(link)).isTrue();
    assertThat(link).isSymbolicLink();
    assertThat(target).hasContent("new");
  }

  @Test
  void directoryIsRefused() throws IOException {
    Path target = Files.createDirectory(folder.resolve("d"));
    assertThat(write(target)).isFalse();
    assertThat(findings.errorCount()).isEqualTo(1);
    assertThat(target).isEmptyDirectory();
    assertNothingElseIsLeft(target);
  }

  @Test
  void deviceIsRefused() {
    Path device = Path.of("/dev/null");
    assumeTrue(Files.exists(device));
    assertThat(write(device)).isFalse();
    assertThat(Files.isRegularFile(device)).isFalse();
  }

  @Test
  void missingFolderIsRefused() {
    assertThat(write(folder.resolve("no").resolve("a"))).isFalse();
    assertThat(findings.sorted().get(0).code()).isEqualTo("not-writable");
    assertThat(folder).isEmptyDirectory();
  }

  private void assertNothingElseIsLeft(Path target) throws IOException {
    try (Stream<Path> left = Files.list(folder)) {
      assertThat(left).containsExactly(target);
    }
  }
}
