package whorl.assist;

import whorl.report.InfoCard;

/**
 * What is known of one thing, for people.
 *
 * @param html a fragment that needs no style sheet and no script
 * @param text the same for a terminal
 */
public record Card(String html, String text) {
  static Card of(InfoCard card) {
    return new Card(card.html(), card.text());
  }
}
