package loadmark.cli;

import java.io.FileDescriptor;
import java.io.FileOutputStream;

/** Where the program starts, and the only place that ends it. */
public final class Main {
  private Main() {}

  /** Runs {@link Loadmark} on the standard streams, past any encoding of the platform's own. */
  @SuppressWarnings("resource") // The standard streams are not ours to close.
  public static void main(String[] arguments) {
    int status =
        Loadmark.run(
            arguments,
            System.in,
            new FileOutputStream(FileDescriptor.out),
            new FileOutputStream(FileDescriptor.err));
    System.exit(status);
  }
}
