package stirwright.exchange;

import java.util.Optional;

/**
 * What somebody said of a block.
 *
 * @param block number from 1, over the whole source
 * @param use what it is; empty: as found
 * @param taken whether it becomes a curve; empty: as its use says
 */
public record BlockChoice(int block, Optional<BlockUse> use, Optional<Boolean> taken) {}
