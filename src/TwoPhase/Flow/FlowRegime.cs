namespace TwoPhase.Flow;

/// <summary>How liquid and vapour share a horizontal or inclined tube.</summary>
public enum FlowRegime
{
    /// <summary>Not determined; the value of a default result.</summary>
    None,

    /// <summary>Only liquid flows, x = 0.</summary>
    Liquid,

    /// <summary>Liquid below, vapour above, smooth between: the top of the tube is dry.</summary>
    StratifiedSmooth,

    /// <summary>Liquid below, vapour above, waves between: the top of the tube is dry.</summary>
    StratifiedWavy,

    /// <summary>Plugs or slugs of liquid that fill the tube by turns.</summary>
    Intermittent,

    /// <summary>A film of liquid all round, vapour with droplets in the core; the film may be thin on top.</summary>
    Annular,

    /// <summary>Bubbles dispersed in the liquid.</summary>
    DispersedBubble,

    /// <summary>Only vapour flows, x = 1.</summary>
    Vapour,
}
