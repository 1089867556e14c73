package loadmark.touchstone;

import static java.util.Comparator.comparing;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;

/** A folder of {@code src/test/touchstone}: a data file and what is expected of it. */
record DataFolder(Path path) {
  private static final Path ROOT = Path.of("src/test/touchstone");

  static Stream<DataFolder> all() {
    try (Stream<Path> all = Files.list(ROOT)) {
      return all.sorted(comparing(Path::toString)).toList().stream().map(DataFolder::new);
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  Path data() {
    try (Stream<Path> files = Files.list(path)) {
      return files.filter(f -> name(f).startsWith("data.")).findFirst().orElseThrow();
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  private static String name(Path file) {
    return String.valueOf(file.getFileName());
  }

  byte[] bytes() {
    try {
      return Files.readAllBytes(data());
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  /** {@code LINE:COLUMN severity code}, one a line. */
  List<String> findings() {
    return lines("expected.txt");
  }

  boolean isRefused() {
    return findings().stream().anyMatch(f -> f.contains(" error "));
  }

  /** {@code HZ ENTRY RE IM}, {@code HZ open} or {@code HZ outside}, one a line. */
  List<String> impedances() {
    return Files.exists(path.resolve("impedance.txt")) ? lines("impedance.txt") : List.of();
  }

  private List<String> lines(String file) {
    try {
      return Files.readAllLines(path.resolve(file), StandardCharsets.UTF_8).stream()
          .map(line -> line.replaceFirst("#.*", "").strip())
          .filter(line -> !line.isEmpty())
          .toList();
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  @Override
  public String toString() {
    return name(path);
  }
}
