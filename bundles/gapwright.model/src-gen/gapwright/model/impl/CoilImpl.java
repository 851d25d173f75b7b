/**
 */
package gapwright.model.impl;

import gapwright.model.Coil;
import gapwright.model.GapwrightPackage;
import gapwright.model.Leg;

import org.eclipse.emf.common.notify.Notification;

import org.eclipse.emf.ecore.EClass;

import org.eclipse.emf.ecore.impl.ENotificationImpl;

/**
 * <!-- begin-user-doc -->
 * An implementation of the model object '<em><b>Coil</b></em>'.
 * <!-- end-user-doc -->
 * <p>
 * The following features are implemented:
 * </p>
 * <ul>
 *   <li>{@link gapwright.model.impl.CoilImpl#getLeg <em>Leg</em>}</li>
 *   <li>{@link gapwright.model.impl.CoilImpl#getTurns <em>Turns</em>}</li>
 *   <li>{@link gapwright.model.impl.CoilImpl#isReversed <em>Reversed</em>}</li>
 *   <li>{@link gapwright.model.impl.CoilImpl#getPosition <em>Position</em>}</li>
 * </ul>
 *
 * @generated
 */
public class CoilImpl extends ElementImpl implements Coil {
	/**
	 * The cached value of the '{@link #getLeg() <em>Leg</em>}' reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getLeg()
	 * @generated
	 * @ordered
	 */
	protected Leg leg;

	/**
	 * The default value of the '{@link #getTurns() <em>Turns</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getTurns()
	 * @generated
	 * @ordered
	 */
	protected static final int TURNS_EDEFAULT = 0;

	/**
	 * The cached value of the '{@link #getTurns() <em>Turns</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getTurns()
	 * @generated
	 * @ordered
	 */
	protected int turns = TURNS_EDEFAULT;

	/**
	 * The default value of the '{@link #isReversed() <em>Reversed</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #isReversed()
	 * @generated
	 * @ordered
	 */
	protected static final boolean REVERSED_EDEFAULT = false;

	/**
	 * The cached value of the '{@link #isReversed() <em>Reversed</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #isReversed()
	 * @generated
	 * @ordered
	 */
	protected boolean reversed = REVERSED_EDEFAULT;

	/**
	 * The default value of the '{@link #getPosition() <em>Position</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getPosition()
	 * @generated
	 * @ordered
	 */
	protected static final double POSITION_EDEFAULT = 0.5;

	/**
	 * The cached value of the '{@link #getPosition() <em>Position</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getPosition()
	 * @generated
	 * @ordered
	 */
	protected double position = POSITION_EDEFAULT;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected CoilImpl() {
		super();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	protected EClass eStaticClass() {
		return GapwrightPackage.Literals.COIL;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Leg getLeg() {
		return leg;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setLeg(Leg newLeg) {
		Leg oldLeg = leg;
		leg = newLeg;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, GapwrightPackage.COIL__LEG, oldLeg, leg));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public int getTurns() {
		return turns;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setTurns(int newTurns) {
		int oldTurns = turns;
		turns = newTurns;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, GapwrightPackage.COIL__TURNS, oldTurns, turns));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public boolean isReversed() {
		return reversed;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setReversed(boolean newReversed) {
		boolean oldReversed = reversed;
		reversed = newReversed;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, GapwrightPackage.COIL__REVERSED, oldReversed, reversed));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public double getPosition() {
		return position;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setPosition(double newPosition) {
		double oldPosition = position;
		position = newPosition;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, GapwrightPackage.COIL__POSITION, oldPosition, position));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Object eGet(int featureID, boolean resolve, boolean coreType) {
		switch (featureID) {
			case GapwrightPackage.COIL__LEG:
				return getLeg();
			case GapwrightPackage.COIL__TURNS:
				return getTurns();
			case GapwrightPackage.COIL__REVERSED:
				return isReversed();
			case GapwrightPackage.COIL__POSITION:
				return getPosition();
		}
		return super.eGet(featureID, resolve, coreType);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void eSet(int featureID, Object newValue) {
		switch (featureID) {
			case GapwrightPackage.COIL__LEG:
				setLeg((Leg)newValue);
				return;
			case GapwrightPackage.COIL__TURNS:
				setTurns((Integer)newValue);
				return;
			case GapwrightPackage.COIL__REVERSED:
				setReversed((Boolean)newValue);
				return;
			case GapwrightPackage.COIL__POSITION:
				setPosition((Double)newValue);
				return;
		}
		super.eSet(featureID, newValue);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void eUnset(int featureID) {
		switch (featureID) {
			case GapwrightPackage.COIL__LEG:
				setLeg((Leg)null);
				return;
			case GapwrightPackage.COIL__TURNS:
				setTurns(TURNS_EDEFAULT);
				return;
			case GapwrightPackage.COIL__REVERSED:
				setReversed(REVERSED_EDEFAULT);
				return;
			case GapwrightPackage.COIL__POSITION:
				setPosition(POSITION_EDEFAULT);
				return;
		}
		super.eUnset(featureID);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public boolean eIsSet(int featureID) {
		switch (featureID) {
			case GapwrightPackage.COIL__LEG:
				return leg != null;
			case GapwrightPackage.COIL__TURNS:
				return turns != TURNS_EDEFAULT;
			case GapwrightPackage.COIL__REVERSED:
				return reversed != REVERSED_EDEFAULT;
			case GapwrightPackage.COIL__POSITION:
				return position != POSITION_EDEFAULT;
		}
		return super.eIsSet(featureID);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public String toString() {
		if (eIsProxy()) return super.toString();

		StringBuilder result = new StringBuilder(super.toString());
		result.append(" (turns: ");
		result.append(turns);
		result.append(", reversed: ");
		result.append(reversed);
		result.append(", position: ");
		result.append(position);
		result.append(')');
		return result.toString();
	}

} //CoilImpl
