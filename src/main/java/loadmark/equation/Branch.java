package loadmark.equation;

/** A two-terminal between two nodes. */
public record Branch(int first, int second, Law law) {}
