/** How a card is written and its plot drawn. */
package stirwright.cards.internal;
