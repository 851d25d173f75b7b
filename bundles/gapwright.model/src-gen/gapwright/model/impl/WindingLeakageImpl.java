/**
 */
package gapwright.model.impl;

import gapwright.model.GapwrightPackage;
import gapwright.model.Winding;
import gapwright.model.WindingArrangement;
import gapwright.model.WindingLeakage;

import gapwright.model.quantity.Quantity;

import org.eclipse.emf.common.notify.Notification;

import org.eclipse.emf.ecore.EClass;

import org.eclipse.emf.ecore.impl.ENotificationImpl;

/**
 * <!-- begin-user-doc -->
 * An implementation of the model object '<em><b>Winding Leakage</b></em>'.
 * <!-- end-user-doc -->
 * <p>
 * The following features are implemented:
 * </p>
 * <ul>
 *   <li>{@link gapwright.model.impl.WindingLeakageImpl#getFirst <em>First</em>}</li>
 *   <li>{@link gapwright.model.impl.WindingLeakageImpl#getSecond <em>Second</em>}</li>
 *   <li>{@link gapwright.model.impl.WindingLeakageImpl#getArrangement <em>Arrangement</em>}</li>
 *   <li>{@link gapwright.model.impl.WindingLeakageImpl#getFirstBuild <em>First Build</em>}</li>
 *   <li>{@link gapwright.model.impl.WindingLeakageImpl#getSecondBuild <em>Second Build</em>}</li>
 *   <li>{@link gapwright.model.impl.WindingLeakageImpl#getSeparation <em>Separation</em>}</li>
 *   <li>{@link gapwright.model.impl.WindingLeakageImpl#getHeight <em>Height</em>}</li>
 *   <li>{@link gapwright.model.impl.WindingLeakageImpl#getMeanTurn <em>Mean Turn</em>}</li>
 *   <li>{@link gapwright.model.impl.WindingLeakageImpl#getInterfaces <em>Interfaces</em>}</li>
 * </ul>
 *
 * @generated
 */
public class WindingLeakageImpl extends ElementImpl implements WindingLeakage {
	/**
	 * The cached value of the '{@link #getFirst() <em>First</em>}' reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getFirst()
	 * @generated
	 * @ordered
	 */
	protected Winding first;

	/**
	 * The cached value of the '{@link #getSecond() <em>Second</em>}' reference.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getSecond()
	 * @generated
	 * @ordered
	 */
	protected Winding second;

	/**
	 * The default value of the '{@link #getArrangement() <em>Arrangement</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getArrangement()
	 * @generated
	 * @ordered
	 */
	protected static final WindingArrangement ARRANGEMENT_EDEFAULT = WindingArrangement.CONCENTRIC;

	/**
	 * The cached value of the '{@link #getArrangement() <em>Arrangement</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getArrangement()
	 * @generated
	 * @ordered
	 */
	protected WindingArrangement arrangement = ARRANGEMENT_EDEFAULT;

	/**
	 * The default value of the '{@link #getFirstBuild() <em>First Build</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getFirstBuild()
	 * @generated
	 * @ordered
	 */
	protected static final Quantity FIRST_BUILD_EDEFAULT = null;

	/**
	 * The cached value of the '{@link #getFirstBuild() <em>First Build</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getFirstBuild()
	 * @generated
	 * @ordered
	 */
	protected Quantity firstBuild = FIRST_BUILD_EDEFAULT;

	/**
	 * The default value of the '{@link #getSecondBuild() <em>Second Build</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getSecondBuild()
	 * @generated
	 * @ordered
	 */
	protected static final Quantity SECOND_BUILD_EDEFAULT = null;

	/**
	 * The cached value of the '{@link #getSecondBuild() <em>Second Build</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getSecondBuild()
	 * @generated
	 * @ordered
	 */
	protected Quantity secondBuild = SECOND_BUILD_EDEFAULT;

	/**
	 * The default value of the '{@link #getSeparation() <em>Separation</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getSeparation()
	 * @generated
	 * @ordered
	 */
	protected static final Quantity SEPARATION_EDEFAULT = null;

	/**
	 * The cached value of the '{@link #getSeparation() <em>Separation</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getSeparation()
	 * @generated
	 * @ordered
	 */
	protected Quantity separation = SEPARATION_EDEFAULT;

	/**
	 * The default value of the '{@link #getHeight() <em>Height</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getHeight()
	 * @generated
	 * @ordered
	 */
	protected static final Quantity HEIGHT_EDEFAULT = null;

	/**
	 * The cached value of the '{@link #getHeight() <em>Height</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getHeight()
	 * @generated
	 * @ordered
	 */
	protected Quantity height = HEIGHT_EDEFAULT;

	/**
	 * The default value of the '{@link #getMeanTurn() <em>Mean Turn</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getMeanTurn()
	 * @generated
	 * @ordered
	 */
	protected static final Quantity MEAN_TURN_EDEFAULT = null;

	/**
	 * The cached value of the '{@link #getMeanTurn() <em>Mean Turn</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getMeanTurn()
	 * @generated
	 * @ordered
	 */
	protected Quantity meanTurn = MEAN_TURN_EDEFAULT;

	/**
	 * The default value of the '{@link #getInterfaces() <em>Interfaces</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getInterfaces()
	 * @generated
	 * @ordered
	 */
	protected static final int INTERFACES_EDEFAULT = 1;

	/**
	 * The cached value of the '{@link #getInterfaces() <em>Interfaces</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getInterfaces()
	 * @generated
	 * @ordered
	 */
	protected int interfaces = INTERFACES_EDEFAULT;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected WindingLeakageImpl() {
		super();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	protected EClass eStaticClass() {
		return GapwrightPackage.Literals.WINDING_LEAKAGE;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Winding getFirst() {
		return first;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setFirst(Winding newFirst) {
		Winding oldFirst = first;
		first = newFirst;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, GapwrightPackage.WINDING_LEAKAGE__FIRST, oldFirst, first));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Winding getSecond() {
		return second;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setSecond(Winding newSecond) {
		Winding oldSecond = second;
		second = newSecond;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, GapwrightPackage.WINDING_LEAKAGE__SECOND, oldSecond, second));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public WindingArrangement getArrangement() {
		return arrangement;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setArrangement(WindingArrangement newArrangement) {
		WindingArrangement oldArrangement = arrangement;
		arrangement = newArrangement == null ? ARRANGEMENT_EDEFAULT : newArrangement;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, GapwrightPackage.WINDING_LEAKAGE__ARRANGEMENT, oldArrangement, arrangement));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Quantity getFirstBuild() {
		return firstBuild;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setFirstBuild(Quantity newFirstBuild) {
		Quantity oldFirstBuild = firstBuild;
		firstBuild = newFirstBuild;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, GapwrightPackage.WINDING_LEAKAGE__FIRST_BUILD, oldFirstBuild, firstBuild));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Quantity getSecondBuild() {
		return secondBuild;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setSecondBuild(Quantity newSecondBuild) {
		Quantity oldSecondBuild = secondBuild;
		secondBuild = newSecondBuild;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, GapwrightPackage.WINDING_LEAKAGE__SECOND_BUILD, oldSecondBuild, secondBuild));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Quantity getSeparation() {
		return separation;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setSeparation(Quantity newSeparation) {
		Quantity oldSeparation = separation;
		separation = newSeparation;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, GapwrightPackage.WINDING_LEAKAGE__SEPARATION, oldSeparation, separation));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Quantity getHeight() {
		return height;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setHeight(Quantity newHeight) {
		Quantity oldHeight = height;
		height = newHeight;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, GapwrightPackage.WINDING_LEAKAGE__HEIGHT, oldHeight, height));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Quantity getMeanTurn() {
		return meanTurn;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setMeanTurn(Quantity newMeanTurn) {
		Quantity oldMeanTurn = meanTurn;
		meanTurn = newMeanTurn;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, GapwrightPackage.WINDING_LEAKAGE__MEAN_TURN, oldMeanTurn, meanTurn));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public int getInterfaces() {
		return interfaces;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setInterfaces(int newInterfaces) {
		int oldInterfaces = interfaces;
		interfaces = newInterfaces;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, GapwrightPackage.WINDING_LEAKAGE__INTERFACES, oldInterfaces, interfaces));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Object eGet(int featureID, boolean resolve, boolean coreType) {
		switch (featureID) {
			case GapwrightPackage.WINDING_LEAKAGE__FIRST:
				return getFirst();
			case GapwrightPackage.WINDING_LEAKAGE__SECOND:
				return getSecond();
			case GapwrightPackage.WINDING_LEAKAGE__ARRANGEMENT:
				return getArrangement();
			case GapwrightPackage.WINDING_LEAKAGE__FIRST_BUILD:
				return getFirstBuild();
			case GapwrightPackage.WINDING_LEAKAGE__SECOND_BUILD:
				return getSecondBuild();
			case GapwrightPackage.WINDING_LEAKAGE__SEPARATION:
				return getSeparation();
			case GapwrightPackage.WINDING_LEAKAGE__HEIGHT:
				return getHeight();
			case GapwrightPackage.WINDING_LEAKAGE__MEAN_TURN:
				return getMeanTurn();
			case GapwrightPackage.WINDING_LEAKAGE__INTERFACES:
				return getInterfaces();
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
			case GapwrightPackage.WINDING_LEAKAGE__FIRST:
				setFirst((Winding)newValue);
				return;
			case GapwrightPackage.WINDING_LEAKAGE__SECOND:
				setSecond((Winding)newValue);
				return;
			case GapwrightPackage.WINDING_LEAKAGE__ARRANGEMENT:
				setArrangement((WindingArrangement)newValue);
				return;
			case GapwrightPackage.WINDING_LEAKAGE__FIRST_BUILD:
				setFirstBuild((Quantity)newValue);
				return;
			case GapwrightPackage.WINDING_LEAKAGE__SECOND_BUILD:
				setSecondBuild((Quantity)newValue);
				return;
			case GapwrightPackage.WINDING_LEAKAGE__SEPARATION:
				setSeparation((Quantity)newValue);
				return;
			case GapwrightPackage.WINDING_LEAKAGE__HEIGHT:
				setHeight((Quantity)newValue);
				return;
			case GapwrightPackage.WINDING_LEAKAGE__MEAN_TURN:
				setMeanTurn((Quantity)newValue);
				return;
			case GapwrightPackage.WINDING_LEAKAGE__INTERFACES:
				setInterfaces((Integer)newValue);
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
			case GapwrightPackage.WINDING_LEAKAGE__FIRST:
				setFirst((Winding)null);
				return;
			case GapwrightPackage.WINDING_LEAKAGE__SECOND:
				setSecond((Winding)null);
				return;
			case GapwrightPackage.WINDING_LEAKAGE__ARRANGEMENT:
				setArrangement(ARRANGEMENT_EDEFAULT);
				return;
			case GapwrightPackage.WINDING_LEAKAGE__FIRST_BUILD:
				setFirstBuild(FIRST_BUILD_EDEFAULT);
				return;
			case GapwrightPackage.WINDING_LEAKAGE__SECOND_BUILD:
				setSecondBuild(SECOND_BUILD_EDEFAULT);
				return;
			case GapwrightPackage.WINDING_LEAKAGE__SEPARATION:
				setSeparation(SEPARATION_EDEFAULT);
				return;
			case GapwrightPackage.WINDING_LEAKAGE__HEIGHT:
				setHeight(HEIGHT_EDEFAULT);
				return;
			case GapwrightPackage.WINDING_LEAKAGE__MEAN_TURN:
				setMeanTurn(MEAN_TURN_EDEFAULT);
				return;
			case GapwrightPackage.WINDING_LEAKAGE__INTERFACES:
				setInterfaces(INTERFACES_EDEFAULT);
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
			case GapwrightPackage.WINDING_LEAKAGE__FIRST:
				return first != null;
			case GapwrightPackage.WINDING_LEAKAGE__SECOND:
				return second != null;
			case GapwrightPackage.WINDING_LEAKAGE__ARRANGEMENT:
				return arrangement != ARRANGEMENT_EDEFAULT;
			case GapwrightPackage.WINDING_LEAKAGE__FIRST_BUILD:
				return FIRST_BUILD_EDEFAULT == null ? firstBuild != null : !FIRST_BUILD_EDEFAULT.equals(firstBuild);
			case GapwrightPackage.WINDING_LEAKAGE__SECOND_BUILD:
				return SECOND_BUILD_EDEFAULT == null ? secondBuild != null : !SECOND_BUILD_EDEFAULT.equals(secondBuild);
			case GapwrightPackage.WINDING_LEAKAGE__SEPARATION:
				return SEPARATION_EDEFAULT == null ? separation != null : !SEPARATION_EDEFAULT.equals(separation);
			case GapwrightPackage.WINDING_LEAKAGE__HEIGHT:
				return HEIGHT_EDEFAULT == null ? height != null : !HEIGHT_EDEFAULT.equals(height);
			case GapwrightPackage.WINDING_LEAKAGE__MEAN_TURN:
				return MEAN_TURN_EDEFAULT == null ? meanTurn != null : !MEAN_TURN_EDEFAULT.equals(meanTurn);
			case GapwrightPackage.WINDING_LEAKAGE__INTERFACES:
				return interfaces != INTERFACES_EDEFAULT;
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
		result.append(" (arrangement: ");
		result.append(arrangement);
		result.append(", firstBuild: ");
		result.append(firstBuild);
		result.append(", secondBuild: ");
		result.append(secondBuild);
		result.append(", separation: ");
		result.append(separation);
		result.append(", height: ");
		result.append(height);
		result.append(", meanTurn: ");
		result.append(meanTurn);
		result.append(", interfaces: ");
		result.append(interfaces);
		result.append(')');
		return result.toString();
	}

} //WindingLeakageImpl
