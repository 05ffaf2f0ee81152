using System.Collections.Immutable;
using JointPlanner.Engine.Formulas;

namespace JointPlanner.Engine.Sections;

/// <summary>What a free-strain profile does to a section. The frame gets exactly two numbers of it, strain and curvature.</summary>
/// <param name="Name">What the profile is, for instance "deck warmer above".</param>
/// <param name="AxialStrain">ε_0 of the neutral axis, lengthening positive.</param>
/// <param name="Curvature">κ, 1/m, positive when the underside lengthens.</param>
/// <param name="SurfaceStrain">Strain at the road surface; a check that holds for one simply supported span alone.</param>
/// <param name="BearingStrain">Strain at bearing level; likewise.</param>
/// <param name="Stresses">Stresses that balance in themselves, at both edges of every layer.</param>
public sealed record SectionState(
    string Name, Number AxialStrain, Number Curvature, Number SurfaceStrain, Number BearingStrain, ImmutableArray<EdgeStress> Stresses);

/// <summary>Stress at an edge of a layer.</summary>
/// <param name="Layer">Id of the layer.</param>
/// <param name="Depth">Depth of the edge, m.</param>
/// <param name="Stress">Stress, Pa, tension positive.</param>
public sealed record EdgeStress(string Layer, Number Depth, Number Stress);
