package pinchoff.kernel.limits;

import java.time.Duration;

/**
 * All limits of one kernel or client.
 *
 * @param frameBytes largest frame of a message that is read; a peer that sends a larger one is cut
 *     off (default 64 MiB)
 * @param frames most frames of one message, identities and buffers included (default 1024)
 * @param jsonDepth deepest nesting of JSON that is read or written (default 100)
 * @param rememberedSignatures how many signatures are kept to refuse a message that comes twice
 *     (default 65 536)
 * @param streamBytes most bytes of text that one cell can print; the rest is dropped with a note
 *     (default 16 MiB)
 * @param streamChunk printed characters that go into one message at most (default 131 072)
 * @param displayChars most characters of one displayed result, all forms together; a larger one is
 *     replaced by a note (default 10 Mi)
 * @param queueBytes bytes that may wait to be broadcast before whoever produces them has to wait
 *     (default 32 MiB)
 * @param subscriberMessages messages kept for a subscriber that does not read (default 256)
 * @param historyEntries inputs kept for history requests (default 10 000)
 * @param streamDelay how long printed text is gathered before it is sent (default 50 ms)
 * @param slowReader how long everybody waits for a subscriber that does not read before its
 *     messages are dropped (default 2 s)
 * @param bindRetry how long an address that is still in use is tried again (default 5 s)
 * @param shutdown how long the end may take to hand over the last messages (default 700 ms)
 */
public record Limits(
    int frameBytes,
    int frames,
    int jsonDepth,
    int rememberedSignatures,
    int streamBytes,
    int streamChunk,
    int displayChars,
    int queueBytes,
    int subscriberMessages,
    int historyEntries,
    Duration streamDelay,
    Duration slowReader,
    Duration bindRetry,
    Duration shutdown) {

  private static final int MIB = 1024 * 1024;

  private static final Limits STANDARD =
      new Limits(
          64 * MIB,
          1024,
          100,
          65_536,
          16 * MIB,
          131_072,
          10 * MIB,
          32 * MIB,
          256,
          10_000,
          Duration.ofMillis(50),
          Duration.ofSeconds(2),
          Duration.ofSeconds(5),
          Duration.ofMillis(700));

  /** Refuses limits that would let nothing through. */
  public Limits {
    int smallest =
        Math.min(
            Math.min(Math.min(frameBytes, frames), Math.min(jsonDepth, rememberedSignatures)),
            Math.min(
                Math.min(Math.min(streamBytes, streamChunk), Math.min(displayChars, queueBytes)),
                Math.min(subscriberMessages, historyEntries)));
    if (smallest < 1 || streamChunk < 2) {
      throw new IllegalArgumentException(
          "a limit of " + smallest + ": expected at least 1, and 2 characters for a stream chunk");
    }
    if (streamDelay.isNegative()
        || slowReader.isNegative()
        || bindRetry.isNegative()
        || shutdown.isNegative()) {
      throw new IllegalArgumentException("a limit of time is negative");
    }
  }

  /** The defaults. */
  public static Limits standard() {
    return STANDARD;
  }

  /** These limits with other bounds on what is read. */
  public Limits withInput(int bytesPerFrame, int framesPerMessage, int depth) {
    return new Limits(
        bytesPerFrame,
        framesPerMessage,
        depth,
        rememberedSignatures,
        streamBytes,
        streamChunk,
        displayChars,
        queueBytes,
        subscriberMessages,
        historyEntries,
        streamDelay,
        slowReader,
        bindRetry,
        shutdown);
  }

  /** These limits with other bounds on what a cell sends out. */
  public Limits withOutput(int streamBytesPerCell, int charsPerChunk, int charsPerDisplay) {
    return new Limits(
        frameBytes,
        frames,
        jsonDepth,
        rememberedSignatures,
        streamBytesPerCell,
        charsPerChunk,
        charsPerDisplay,
        queueBytes,
        subscriberMessages,
        historyEntries,
        streamDelay,
        slowReader,
        bindRetry,
        shutdown);
  }

  /** These limits with other bounds on what waits for slow readers. */
  public Limits withWaiting(int bytesQueued, int messagesPerSubscriber, Duration patience) {
    return new Limits(
        frameBytes,
        frames,
        jsonDepth,
        rememberedSignatures,
        streamBytes,
        streamChunk,
        displayChars,
        bytesQueued,
        messagesPerSubscriber,
        historyEntries,
        streamDelay,
        patience,
        bindRetry,
        shutdown);
  }

  /** These limits with another patience at start-up. */
  public Limits withBindRetry(Duration patience) {
    return new Limits(
        frameBytes,
        frames,
        jsonDepth,
        rememberedSignatures,
        streamBytes,
        streamChunk,
        displayChars,
        queueBytes,
        subscriberMessages,
        historyEntries,
        streamDelay,
        slowReader,
        patience,
        shutdown);
  }

  /** These limits with another number of remembered signatures and history entries. */
  public Limits withMemory(int signatures, int inputs) {
    return new Limits(
        frameBytes,
        frames,
        jsonDepth,
        signatures,
        streamBytes,
        streamChunk,
        displayChars,
        queueBytes,
        subscriberMessages,
        inputs,
        streamDelay,
        slowReader,
        bindRetry,
        shutdown);
  }
}
