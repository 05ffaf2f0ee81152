using System.Collections.Immutable;
using System.Reflection.Emit;
using System.Reflection.Metadata;
using System.Reflection.Metadata.Ecma335;

namespace JointPlanner.Architecture.Tests.Compiled;

/// <summary>One instruction: where it stands, what it does, the token or number it carries, where it may jump to.</summary>
public sealed record Instruction(int Offset, OpCode Code, int Operand, ImmutableArray<int> Targets)
{
    private static readonly Dictionary<int, OpCode> Codes = typeof(OpCodes).GetFields()
        .Where(f => f.FieldType == typeof(OpCode)).Select(f => (OpCode)f.GetValue(null)!).ToDictionary(c => c.Value & 0xFFFF);

    public EntityHandle Entity => MetadataTokens.EntityHandle(Operand);

    public bool NamesAnEntity => Code.OperandType is OperandType.InlineMethod or OperandType.InlineField or OperandType.InlineType or OperandType.InlineTok;

    public static IEnumerable<Instruction> Read(MethodBodyBlock body)
    {
        var instructions = new List<Instruction>();
        var reader = body.GetILReader();
        while (reader.RemainingBytes > 0)
        {
            var offset = reader.Offset;
            int value = reader.ReadByte();
            if (value == 0xFE)
            {
                value = 0xFE00 | reader.ReadByte();
            }
            instructions.Add(ReadOperand(ref reader, offset, Codes[value]));
        }
        return instructions;
    }

    private static Instruction ReadOperand(ref BlobReader reader, int offset, OpCode code)
    {
        var operand = 0;
        ImmutableArray<int> targets = [];
        switch (code.OperandType)
        {
            case OperandType.InlineNone:
                break;
            case OperandType.ShortInlineVar or OperandType.ShortInlineI:
                operand = reader.ReadByte();
                break;
            case OperandType.InlineVar:
                operand = reader.ReadUInt16();
                break;
            case OperandType.ShortInlineBrTarget:
                var near = reader.ReadSByte();
                targets = [reader.Offset + near];
                break;
            case OperandType.InlineBrTarget:
                var far = reader.ReadInt32();
                targets = [reader.Offset + far];
                break;
            case OperandType.InlineSwitch:
                var jumps = Enumerable.Range(0, reader.ReadInt32()).ToArray();
                for (var i = 0; i < jumps.Length; i++)
                {
                    jumps[i] = reader.ReadInt32();
                }
                var end = reader.Offset;
                targets = [.. jumps.Select(j => end + j)];
                break;
            case OperandType.InlineI8 or OperandType.InlineR:
                reader.ReadInt64();
                break;
            default: // tokens, 32-bit numbers and short floating-point numbers: four bytes each
                operand = reader.ReadInt32();
                break;
        }
        return new(offset, code, operand, targets);
    }
}
