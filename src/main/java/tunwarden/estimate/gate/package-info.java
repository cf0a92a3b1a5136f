/** Gates every reading passes before it may move a belief; each is written "accept if at most". */
package tunwarden.estimate.gate;
