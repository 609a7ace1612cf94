package whorl.page;

/** What cells without a first line of their own are written in. */
public enum PlainLanguage {
  /** The sheet language; {@code %%java} begins a cell in Java. */
  SHEET,
  /** Java; {@code %%sheet} begins a cell in the sheet language. */
  JAVA
}
