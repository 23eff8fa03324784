package pinchoff.page;

/** What stands on a line of its own in a page. */
public sealed interface Block
    permits Heading,
        Prose,
        RelationBlock,
        Table,
        PictureBlock,
        VerdictBlock,
        CautionBlock,
        Listing,
        TrustLine,
        Fold {}
