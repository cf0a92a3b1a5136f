/**
 * The bank of small filters: numbers only, no clock, no words. A filter is a Gaussian over eight
 * hidden quantities under one assumption about the transfer coefficient, the air left behind and
 * the way the headspace is connected; the bank weighs the assumptions by how well each predicts.
 */
package tunwarden.estimate.bank;
