package loadmark.network;

import java.util.OptionalDouble;

/**
 * A two-terminal part between two nodes.
 *
 * @param kind the statement's word: {@code resistor}, {@code capacitor}, …
 * @param text the value as the user wrote it
 * @param rated in W for a resistor, V for a capacitor
 * @param line where it is declared, from 1
 */
public record Part(
    String name,
    String kind,
    Node first,
    Node second,
    OnePort value,
    String text,
    OptionalDouble rated,
    int line) {}
