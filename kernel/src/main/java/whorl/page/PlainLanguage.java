package whorl.page;

/** What cells are written in; a page has one for those without a first line that says so. */
public enum PlainLanguage {
  /** The sheet language; {@code %%java} begins a cell in Java. */
  SHEET,
  /** Java; {@code %%sheet} begins a cell in the sheet language. */
  JAVA
}
