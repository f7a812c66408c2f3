/** Planted for the architecture test. */
package planted.gossip;
