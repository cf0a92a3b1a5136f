/**
 * What a person wants done in a program that runs without a screen: a small file left in the data
 * folder, taken up and answered within a second or two. Whoever may write to the folder may ask;
 * there is no other way in, and none over the network.
 */
package tunwarden.journal.request;
