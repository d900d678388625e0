global using TwoPhase.Tests.Support;
global using Xunit;
