using JointPlanner.Engine.Fitting.Joints.CompressionSeals;
using JointPlanner.Engine.Fitting.Joints.Fingers;
using JointPlanner.Engine.Fitting.Joints.Modulars;
using JointPlanner.Engine.Fitting.Joints.StripSeals;

namespace JointPlanner.Engine.Fitting.Joints;

/// <summary>The joint families there are.</summary>
public static class JointFamilies
{
    /// <summary>Every family.</summary>
    public static readonly IReadOnlyList<JointFamily> All = [new CompressionSeal(), new StripSeal(), new FingerJoint(), new ModularJoint()];

    /// <summary>The family of this word; null where there is none.</summary>
    public static JointFamily? Named(string word) => All.FirstOrDefault(f => f.Word == word);
}
