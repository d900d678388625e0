namespace Backfill.Commands;

/// <summary>Where everything stands that the commands make or read when nothing else is said.</summary>
internal sealed record DemoFolder(string Root)
{
    public string Generator => Path.Combine(Root, "generator.json");

    public string History => Path.Combine(Root, "history");

    public string Truth => Path.Combine(Root, "truth");

    public string Estimates => Path.Combine(Root, "estimates");
}
