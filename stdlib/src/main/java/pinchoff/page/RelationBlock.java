package pinchoff.page;

/** A relation on a line of its own. */
public record RelationBlock(Relation relation) implements Block {}
