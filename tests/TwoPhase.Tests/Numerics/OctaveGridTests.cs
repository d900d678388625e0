using TwoPhase.Numerics;

namespace TwoPhase.Tests.Numerics;

public class OctaveGridTests
{
    [Theory]
    [InlineData(3)]
    [InlineData(4)]
    public void Locate_EdgesOfCells_BelongToTheCellAbove(int bits)
    {
        int first = OctaveGrid.Locate(65536, bits, out double place);
        Assert.Equal(-1, place);
        for (int cell = first; cell < first + 100; cell++)
        {
            double start = OctaveGrid.Start(cell, bits), end = OctaveGrid.Start(cell + 1, bits);
            Assert.Equal(cell, OctaveGrid.Locate(start, bits, out double atStart));
            Assert.Equal(-1, atStart);
            Assert.Equal(cell, OctaveGrid.Locate((start + end) / 2, bits, out double middle));
            Assert.Equal(0, middle);
            Assert.Equal(cell, OctaveGrid.Locate(start + (0.75 * (end - start)), bits, out double threeQuarters));
            Assert.Equal(0.5, threeQuarters);
        }
    }

    [Fact]
    public void Start_OneOctave_HasTheCellsItShould() =>
        Assert.Equal(131072, OctaveGrid.Start(OctaveGrid.Locate(65536, 4, out _) + 16, 4));
}
