global using Xunit;

// One test watches the memory of the process, another wants the processors for itself.
[assembly: CollectionBehavior(DisableTestParallelization = true)]
