package planted.gossip;

/** Lives in a package that has no place in the order. */
record Unlisted() {}
