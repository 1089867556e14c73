package loadmark.binding;

/** What a network is bound for: it decides what the file must hold. */
public enum Purpose {
  /** Needs a port, and a limit that can be judged. */
  CHECK,
  /** Needs a port only; limits are read, but not needed. */
  CURVE
}
