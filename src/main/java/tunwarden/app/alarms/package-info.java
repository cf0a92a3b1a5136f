/** Looking at and answering the alarms of a program that runs without a screen. */
package tunwarden.app.alarms;
