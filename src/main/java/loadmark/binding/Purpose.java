package loadmark.binding;

/** What the network is bound for. Stand-in. */
public enum Purpose {
  CHECK,
  CURVE
}
