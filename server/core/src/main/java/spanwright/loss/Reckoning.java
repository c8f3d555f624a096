package spanwright.loss;

/** What comes of reckoning a path's loss: the loss, or why it is not known. */
public sealed interface Reckoning permits PathLoss, LossUnknown {}
