[assembly: Xunit.CollectionBehavior(DisableTestParallelization = true)]   // each runs a whole service, and one weighs its memory
