package pinchoff.page;

/** Something that the reader must know before using the numbers. Labelled "Caution". */
public record CautionBlock(Phrase text) implements Block {}
