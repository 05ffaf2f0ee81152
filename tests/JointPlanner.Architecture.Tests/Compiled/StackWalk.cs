using System.Collections.Immutable;
using System.Reflection.Emit;
using System.Reflection.Metadata;

namespace JointPlanner.Architecture.Tests.Compiled;

/// <summary>
/// Walks a method's instructions once, in order, and keeps for each value on the evaluation stack whether it is a floating-point
/// number: the arithmetic instructions do not say so themselves. One pass is enough, for the standard forbids a stack that only a
/// later instruction could explain (ECMA-335, III.1.7.5).
/// </summary>
public sealed class StackWalk
{
    private static readonly HashSet<OpCode> Arithmetic = [OpCodes.Add, OpCodes.Sub, OpCodes.Mul, OpCodes.Div, OpCodes.Rem, OpCodes.Neg];

    private readonly Method method;
    private readonly ImmutableArray<Shape> arguments;
    private readonly ImmutableArray<Shape> locals;
    private readonly Dictionary<int, bool[]> stackAt = [];
    private readonly Stack<bool> stack = new();
    private readonly List<OpCode> found = [];

    private StackWalk(Method method)
    {
        this.method = method;
        var member = method.Member;
        arguments = member.HasThis ? [member.Owner, .. member.Parameters] : member.Parameters;
        locals = method.Locals;
        foreach (var region in method.Body.ExceptionRegions)
        {
            // A handler starts with the exception on the stack, or with nothing.
            bool[] given = region.Kind is ExceptionRegionKind.Catch or ExceptionRegionKind.Filter ? [false] : [];
            stackAt[region.HandlerOffset] = given;
            if (region.Kind == ExceptionRegionKind.Filter)
            {
                stackAt[region.FilterOffset] = [false];
            }
        }
    }

    /// <summary>The arithmetic instructions of the method that work on floating-point numbers.</summary>
    public static IReadOnlyList<OpCode> FloatingArithmeticOf(Method method)
    {
        var walk = new StackWalk(method);
        foreach (var instruction in method.Instructions)
        {
            walk.Take(instruction);
        }
        return walk.found;
    }

    private void Take(Instruction instruction)
    {
        if (stackAt.TryGetValue(instruction.Offset, out var given))
        {
            stack.Clear();
            Array.ForEach(given, stack.Push);
        }
        var code = instruction.Code;
        if (Arithmetic.Contains(code))
        {
            var floating = stack.Pop() | (code != OpCodes.Neg && stack.Pop());
            if (floating)
            {
                found.Add(code);
            }
            stack.Push(floating);
        }
        else if (code == OpCodes.Dup)
        {
            stack.Push(stack.Peek());
        }
        else if (code == OpCodes.Ret)
        {
            stack.Clear();
        }
        else if (code.FlowControl == FlowControl.Call)
        {
            Call(instruction);
        }
        else
        {
            for (var popped = PoppedBy(code.StackBehaviourPop); popped > 0; popped--)
            {
                stack.Pop();
            }
            Push(instruction);
        }
        Leave(instruction);
    }

    private void Call(Instruction instruction)
    {
        if (instruction.Code == OpCodes.Calli)
        {
            throw new NotSupportedException($"{method.FullName} calls through a function pointer: teach this walk to read it.");
        }
        var called = Member.Of(method.Reader, instruction.Entity);
        var taken = called.Parameters.Length + (called.HasThis && instruction.Code != OpCodes.Newobj ? 1 : 0);
        for (; taken > 0; taken--)
        {
            stack.Pop();
        }
        if (instruction.Code == OpCodes.Newobj)
        {
            stack.Push(false);
        }
        else if (called.Result.Kind != ShapeKind.Void)
        {
            stack.Push(called.Result.IsFloating);
        }
    }

    private void Push(Instruction instruction)
    {
        switch (instruction.Code.StackBehaviourPush)
        {
            case StackBehaviour.Push0:
                break;
            case StackBehaviour.Pushr4 or StackBehaviour.Pushr8:
                stack.Push(true);
                break;
            case StackBehaviour.Push1:
                stack.Push(LoadsFloating(instruction));
                break;
            default:
                stack.Push(false);
                break;
        }
    }

    private bool LoadsFloating(Instruction instruction)
    {
        var name = instruction.Code.Name!;
        if (name.StartsWith("ldarg", StringComparison.Ordinal))
        {
            return arguments[IndexOf(instruction, name)].IsFloating;
        }
        if (name.StartsWith("ldloc", StringComparison.Ordinal))
        {
            return locals[IndexOf(instruction, name)].IsFloating;
        }
        if (instruction.Code.OperandType == OperandType.InlineField)
        {
            return Member.Of(method.Reader, instruction.Entity).Result.IsFloating;
        }
        // ldobj, ldelem and unbox.any name the type of what they load; whole-number operations name none.
        return instruction.Code.OperandType == OperandType.InlineType && Member.OwnerOf(method.Reader, instruction.Entity).IsFloating;
    }

    // The short forms carry their index in their name, as in ldarg.1; the others as an operand.
    private static int IndexOf(Instruction instruction, string name) => char.IsAsciiDigit(name[^1]) ? name[^1] - '0' : instruction.Operand;

    private void Leave(Instruction instruction)
    {
        var flow = instruction.Code.FlowControl;
        if (instruction.Code.Name!.StartsWith("leave", StringComparison.Ordinal))
        {
            stack.Clear();
        }
        foreach (var target in instruction.Targets.Where(t => t > instruction.Offset))
        {
            stackAt.TryAdd(target, [.. stack.Reverse()]);
        }
        if (flow is FlowControl.Branch or FlowControl.Return or FlowControl.Throw)
        {
            stack.Clear();
        }
    }

    private static int PoppedBy(StackBehaviour behaviour) => behaviour switch
    {
        StackBehaviour.Pop0 => 0,
        StackBehaviour.Pop1 or StackBehaviour.Popi or StackBehaviour.Popref => 1,
        StackBehaviour.Pop1_pop1 or StackBehaviour.Popi_pop1 or StackBehaviour.Popi_popi or StackBehaviour.Popi_popi8 or StackBehaviour.Popi_popr4
            or StackBehaviour.Popi_popr8 or StackBehaviour.Popref_pop1 or StackBehaviour.Popref_popi => 2,
        StackBehaviour.Popi_popi_popi or StackBehaviour.Popref_popi_popi or StackBehaviour.Popref_popi_popi8 or StackBehaviour.Popref_popi_popr4
            or StackBehaviour.Popref_popi_popr8 or StackBehaviour.Popref_popi_popref or StackBehaviour.Popref_popi_pop1 => 3,
        _ => throw new NotSupportedException($"The walk does not know how many values {behaviour} takes."),
    };
}
