// One seed for every property, so that a build passes or fails for what was changed and nothing else. To look further, take this
// line out and run the tests a few times: what fails prints its own seed, and becomes a test with that case.
[assembly: FsCheck.Xunit.Properties(Replay = "(20261201,271828183)")]
