namespace TwoPhase.Units;

/// <summary>The name of a column or point, and the unit its numbers are in: <c>FT-101 [m3/d at 15 degC]</c>.</summary>
public sealed class Tag : IEquatable<Tag>
{
    /// <summary>Makes a tag.</summary>
    /// <param name="name">Name, as the historian or the file spells it; not empty.</param>
    /// <param name="unit">Unit text with its basis; empty when the file itself says it.</param>
    /// <exception cref="ArgumentException"><paramref name="name"/> is empty.</exception>
    public Tag(string name, string unit)
    {
        Name = Require.NotNull(name, nameof(name)).Trim();
        Unit = Require.NotNull(unit, nameof(unit)).Trim();
        if (Name.Length == 0) throw new ArgumentException("A tag needs a name.", nameof(name));
    }

    /// <summary>Name, as the historian or the file spells it.</summary>
    public string Name { get; }

    /// <summary>Unit text with its basis; empty when not said.</summary>
    public string Unit { get; }

    /// <summary>Reads <c>name [unit]</c>, or a bare name.</summary>
    /// <param name="text">The text.</param>
    /// <exception cref="FormatException">The text has no name.</exception>
    public static Tag Parse(string text)
    {
        string trimmed = Require.NotNull(text, nameof(text)).Trim();
        int open = trimmed.Length > 0 && trimmed[^1] == ']' ? trimmed.LastIndexOf('[') : -1;
        string name = open < 0 ? trimmed : trimmed[..open].Trim();
        if (name.Length == 0) throw new FormatException($"'{text}' has no tag name; a tag is written like 'FT-101 [kg/s]'.");
        return new Tag(name, open < 0 ? "" : trimmed[(open + 1)..^1]);
    }

    /// <summary>This tag with another unit.</summary>
    /// <param name="unit">Unit text.</param>
    public Tag WithUnit(string unit) => new(Name, unit);

    /// <summary>Same name and same unit text, letter by letter.</summary>
    /// <param name="other">The other tag.</param>
    public bool Equals(Tag? other) => other is not null && Name == other.Name && Unit == other.Unit;

    /// <summary>Same name and same unit text, letter by letter.</summary>
    /// <param name="obj">The other tag.</param>
    public override bool Equals(object? obj) => Equals(obj as Tag);

    /// <summary>Hash of name and unit.</summary>
    public override int GetHashCode() => (Name, Unit).GetHashCode();

    internal object ToDump() => ToString();

    /// <summary>As <see cref="Parse"/> reads it.</summary>
    public override string ToString() => Unit.Length == 0 ? Name : $"{Name} [{Unit}]";

    /// <summary>Factor and offset to SI; a fault names the tag.</summary>
    internal LinearMap Map(UnitKind kind, UnitBasis basis)
    {
        try
        {
            return UnitText.Map(Unit, kind, basis);
        }
        catch (FormatException error)
        {
            throw new FormatException($"Tag '{Name}': {error.Message}.", error);
        }
    }
}
