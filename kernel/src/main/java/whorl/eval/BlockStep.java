package whorl.eval;

/** One step of a block program, done for all rows of a block before the next. */
sealed interface BlockStep {
  void run(BlockRun block);

  /** Copies the block's rows of a varying column into a register. */
  record Load(int column, int register) implements BlockStep {
    @Override
    public void run(BlockRun block) {
      block.load(column, register);
    }
  }

  /** Works out a register from up to three registers. */
  record Compute(RowOperation operation, int target, int a, int b, int c) implements BlockStep {
    @Override
    public void run(BlockRun block) {
      block.compute(operation, target, a, b, c);
    }
  }

  /** Copies a register to the block's rows of a column of results. */
  record Store(int register, int column) implements BlockStep {
    @Override
    public void run(BlockRun block) {
      block.store(register, column);
    }
  }
}
