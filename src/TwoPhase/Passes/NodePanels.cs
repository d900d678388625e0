namespace TwoPhase.Passes;

/// <summary>The panels of a profile, one after the other, without allocation.</summary>
internal ref struct NodePanels(ReadOnlySpan<PassNode> nodes)
{
    private readonly ReadOnlySpan<PassNode> _nodes = nodes;
    private int _first = -Panel.Intervals;

    public readonly NodePanel Current => new(_nodes.Slice(_first, Panel.Intervals + 1));

    public readonly NodePanels GetEnumerator() => this;

    public bool MoveNext()
    {
        _first += Panel.Intervals;

        // A section begins with a row of its own beside the last one of the section before.
        if (_first + 1 < _nodes.Length && _nodes[_first].Duct != _nodes[_first + 1].Duct) _first++;
        return _first + Panel.Intervals < _nodes.Length;
    }
}

/// <summary>Five rows of a profile, equally spaced.</summary>
internal readonly ref struct NodePanel(ReadOnlySpan<PassNode> nodes)
{
    public ReadOnlySpan<PassNode> Nodes { get; } = nodes;

    public int Duct => Nodes[0].Duct;

    public double Spacing => (Nodes[Panel.Intervals].Position - Nodes[0].Position) / Panel.Intervals;

    /// <summary>Integral along the panel of a figure of its rows.</summary>
    public double Integral(NodeFigure figure) =>
        Panel.Boole(Spacing, figure(Nodes[0]), figure(Nodes[1]), figure(Nodes[2]), figure(Nodes[3]), figure(Nodes[4]));
}

/// <summary>A figure of a row; by reference, since a row is some thirty doubles.</summary>
internal delegate double NodeFigure(in PassNode node);
