package rampwright.optimiser.sheet;

/** Text of a page with its elements; everything that comes from outside is escaped. */
final class Markup {
  private final StringBuilder text = new StringBuilder();

  /** Adds markup as it is. */
  Markup raw(String markup) {
    text.append(markup);
    return this;
  }

  /** Adds words of a person. */
  Markup words(String words) {
    text.append(escaped(words));
    return this;
  }

  /** Opens an element; {@code attributes} may be empty. */
  Markup open(String element, String attributes) {
    text.append('<').append(element).append(attributes.isEmpty() ? "" : " ").append(attributes);
    text.append('>');
    return this;
  }

  /** Closes an element. */
  Markup close(String element) {
    text.append("</").append(element).append('>');
    return this;
  }

  /** Adds an element that holds words only. */
  Markup element(String element, String attributes, String words) {
    return open(element, attributes).words(words).close(element);
  }

  /** Adds a table cell of a class. */
  Markup cell(String style, String words) {
    return element("td", style.isEmpty() ? "" : "class='" + style + "'", words);
  }

  /** Adds a heading of a section. */
  Markup heading(String words) {
    return element("h2", "", words);
  }

  @Override
  public String toString() {
    return text.toString();
  }

  /** Returns words with markup and what XML forbids replaced. */
  static String escaped(String words) {
    StringBuilder out = new StringBuilder();
    words.codePoints().forEach(c -> append(out, c));
    return out.toString();
  }

  private static void append(StringBuilder out, int c) {
    switch (c) {
      case '&' -> out.append("&amp;");
      case '<' -> out.append("&lt;");
      case '>' -> out.append("&gt;");
      case '\'' -> out.append("&#39;");
      case '"' -> out.append("&quot;");
      default -> {
        boolean allowed = c >= 0x20 && c <= 0xD7FF || c >= 0xE000 && c <= 0xFFFD || c >= 0x10000;
        out.appendCodePoint(allowed ? c : ' ');
      }
    }
  }
}
